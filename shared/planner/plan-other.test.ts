import { describe, expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { planOne } from './plan-one.ts';
import { expectedGaps } from './plan-relevel.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };

describe('a pole to be straightened', () => {
  it('by its measured gap', () => {
    // WR-17: ½·4 in·11 in·4.5 ft/144 = 0.6875 ft³; need 0.75625: one kit of 1.5.
    const plan = planOne(
      {
        kind: 'straighten',
        gapAtGradeIn: '4',
        gapDepthFt: '4.5',
        diameterGroundLineIn: '11',
        poleMaterial: 'steel',
      },
      CONTEXT,
    );
    expect(plan.voidFt3?.likely).toBeCloseTo(0.6875, 4);
    expect(plan.kits.likely?.kits).toEqual([1.5]);
    // By hand: gap ± 0.25, width ± 0.2, depth ± 1 in: ½·3.75·10.8·(53/12)/144 = 0.62109; ½·4.25·11.2·(55/12)/144 = 0.75752.
    expect(plan.voidFt3?.low).toBeCloseTo(0.6211, 4);
    expect(plan.voidFt3?.high).toBeCloseTo(0.7575, 4);
  });

  it('with a gap left at depth', () => {
    // WR-18: 1.1736 ft³.
    const plan = planOne(
      { kind: 'straighten', gapAtGradeIn: '5', gapAtDepthIn: '1.5', gapDepthFt: '4', gapWidthIn: '13' },
      CONTEXT,
    );
    expect(plan.voidFt3?.likely).toBeCloseTo(1.1736, 4);
  });

  it('by its lean, half of the embedment deep', () => {
    // 40 ft in soil stands 6 ft deep: 3 ft foamed (`gap-shallow`, half). 8 in per 10 ft opens 8·3/10 = 2.4 in (`gap-against-lean`).
    // ½·2.4·(33.5/π)·3/144 = 0.26658 ft³.
    const plan = planOne(
      {
        kind: 'straighten',
        poleLengthFt: '40',
        poleClass: '4',
        poleMaterial: 'southern-pine',
        leanInPer10Ft: '8',
      },
      CONTEXT,
    );
    expect(plan.values['gapAtGradeIn']).toBeCloseTo(2.4, 10);
    expect(plan.depthFt).toBe(3);
    expect(plan.voidFt3?.likely).toBeCloseTo(0.2666, 4);
  });

  it('says what it lacks', () => {
    expect(planOne({ kind: 'straighten' }, CONTEXT).faults.map(({ field }) => field)).toEqual([
      'leanInPer10Ft',
      'gapDepthFt',
      'diameterGroundLineIn',
    ]);
    const wet = planOne(
      { kind: 'straighten', gapAtGradeIn: '4', gapDepthFt: '4', gapWidthIn: '12', waterIn: '3' },
      CONTEXT,
    );
    expect(wet.notes.map(({ text }) => text)).toContain(
      'Water with the pole in is 3 in; the limit is 2 in. Remove it before the pour.',
    );
  });
});

describe('a pad to be brought level', () => {
  it('by its gaps', () => {
    // WR-19: (48·42 − 24·18)·2.5/1728 = 2.2917 ft³; need 2.5208: 2.5 is short by a hair, 4 left over too much, so the least surplus.
    const plan = planOne(
      {
        kind: 'relevel',
        padLengthIn: '48',
        padWidthIn: '42',
        openingLengthIn: '24',
        openingWidthIn: '18',
        gap1In: '1',
        gap2In: '3',
        gap3In: '4',
        gap4In: '2',
      },
      CONTEXT,
    );
    expect(plan.voidFt3?.likely).toBeCloseTo(2.2917, 4);
    // 1.5 + 1.5 = 3.0 leaves 0.479, within 0.5: the fewest kits within the band is two.
    expect(plan.kits.likely?.kits).toEqual([1.5, 1.5]);
  });

  it('by its slopes, level at the highest corner', () => {
    // ½ in per ft down to the back over 4 ft: 2 in; ¼ in per ft up to the right over 3.5 ft: 0.875 in. Highest is the front right.
    expect(
      expectedGaps({ lengthIn: 48, widthIn: 42, alongInPerFt: -0.5, acrossInPerFt: 0.25, liftIn: 0 }),
    ).toEqual([0.875, 2.875, 2, 0]);
    const plan = planOne(
      {
        kind: 'relevel',
        padLengthIn: '48',
        padWidthIn: '42',
        slopeAlongInPerFt: '-0.5',
        slopeAcrossInPerFt: '0.25',
      },
      CONTEXT,
    );
    // 48·42·(5.75/4)/1728 = 1.67708.
    expect(plan.voidFt3?.likely).toBeCloseTo(1.6771, 4);
  });

  it('asks about gaps that no flat pad has', () => {
    // WR-20: |1 + 1 − 3 − 3|/2 = 2 in.
    const plan = planOne(
      {
        kind: 'relevel',
        padLengthIn: '40',
        padWidthIn: '40',
        gap1In: '1',
        gap2In: '3',
        gap3In: '1',
        gap4In: '3',
      },
      CONTEXT,
    );
    expect(plan.voidFt3?.likely).toBeCloseTo(1.8519, 4);
    expect(plan.notes[0]?.text).toContain('2 in from those of a flat pad');
  });

  it('says what it lacks', () => {
    expect(planOne({ kind: 'relevel', gap1In: '1' }, CONTEXT).faults.map(({ field }) => field)).toEqual([
      'padLengthIn',
      'padWidthIn',
      'gap2In',
      'gap3In',
      'gap4In',
    ]);
  });
});

import { describe, expect, it, test } from 'vitest';
import { deriveSet } from './derive-set.ts';
import { chooseKits, planKits } from './kit-plan.ts';
import { setGeometry } from './set-geometry.ts';
import { sizeAtGrade } from './straighten-void.ts';
import { strengthShare } from './strength-share.ts';
import { positiveOf } from './values.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

/** The figures made of the single computations, exactly where one case ends and the next begins. */

const SET = {
  poleMaterial: 'southern-pine',
  poleLengthFt: 40,
  poleClass: '4',
  ground: 'soil',
  embedmentFt: 6,
  boreDepthFt: 6,
  boreTopIn: 20,
  diameterGroundLineIn: 14,
  diameterButtIn: 12,
  bedFt: 0,
  foamTopBelowGradeIn: 0,
};

test('a number above zero is above zero', () => {
  expect(positiveOf({ a: 0 }, 'a')).toBeNull();
  expect(positiveOf({ a: 5e-324 }, 'a')).toBe(5e-324);
});

test('rock is drawn where the ground has it under soil', () => {
  expect(setGeometry({ ...SET, ground: 'soil-over-rock', rockFromFt: 3 })?.rockFromFt).toBe(3);
  expect(setGeometry({ ...SET, rockFromFt: 3 })?.rockFromFt).toBeNull();
});

// A cone's volume moves by 2·d₁ + d₂ with one end and d₁ + 2·d₂ with the other: the wider end counts more.
test('of two taped sizes the wider one matters most', () => {
  const uncertainty = { ...DEMO_STANDARD.uncertainty, boreIn: 0, depthIn: 0 };
  const derived = deriveSet({
    values: SET,
    pours: [],
    standard: { ...DEMO_STANDARD, uncertainty },
    product: DEMO_PRODUCT,
  });
  expect(derived.worstReading).toBe('diameterGroundLineIn');
});

// 40 ft, H1: 43.5 in of girth at 6 ft less 0.42647 in per ft over 102 ft is 0.
test('a pole whose taper leaves nothing at grade has no size there', () => {
  const values = { poleMaterial: 'southern-pine', poleLengthFt: 40, poleClass: 'H1' };
  expect(sizeAtGrade({ ...values, embedmentFt: 108 }, null)).toBeNull();
  expect(sizeAtGrade({ ...values, embedmentFt: 107 }, null)).toMatchObject({ taped: false });
});

test('foam has no strength when it is poured', () => {
  const strength = [
    { minutes: 0, share: 0.1 },
    { minutes: 60, share: 0.8 },
  ];
  expect(strengthShare({ minutes: 0, product: { ...DEMO_PRODUCT, strength }, tempF: 72 })).toBe(0);
});

describe('kits', () => {
  it('are none for a need within the slack of 1e-9', () => {
    expect(chooseKits(1e-9, [8], 0.5)).toEqual({ kits: [], surplusFt3: 0 });
  });

  // 12 − 4.999999999 = 7 + 1e-9: within the band of 7 and its slack, and one kit is fewer than two.
  it('may exceed the need by the band and its slack', () => {
    expect(chooseKits(4.999999999, [3, 12], 7)?.kits).toEqual([12]);
    expect(chooseKits(4.999999998, [3, 12], 7)?.kits).toEqual([3, 3]);
  });

  // 1,999,999 kits and one more to look at are 2,000,000 sums.
  it('are chosen from up to two million sums', () => {
    expect(chooseKits(8 * 1_999_999, [8], 0)?.kits).toHaveLength(1_999_999);
    expect(chooseKits(8 * 2_000_000, [8], 0)).toBeNull();
  });

  // 8·1.1 = 8.8 ft³ in the full-yield band; up to 0.88 more: 8 and 1.5.
  it('are planned for a void with its allowance', () => {
    const plan = planKits({ voidFt3: 8, tempF: 72, product: DEMO_PRODUCT, standard: DEMO_STANDARD });
    expect(plan?.needFt3).toBeCloseTo(8.8, 9);
    expect(plan?.kits).toEqual([8, 1.5]);
    expect(plan?.surplusFt3).toBeCloseTo(0.7, 9);
    expect(
      planKits({ voidFt3: Number.NaN, tempF: 72, product: DEMO_PRODUCT, standard: DEMO_STANDARD }),
    ).toBeNull();
  });
});

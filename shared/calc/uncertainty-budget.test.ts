import { describe, expect, it } from 'vitest';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { uncertaintyBudget } from './uncertainty-budget.ts';

/** Record WR-01 of the worked records. */
const POLE = {
  poleMaterial: 'southern-pine',
  poleLengthFt: 40,
  poleClass: '4',
  ground: 'soil',
  embedmentFt: 6,
  boreDepthFt: 6,
  boreTopIn: 20,
  girthGroundLineIn: 35,
  girthButtIn: 38,
  foamTopBelowGradeIn: 0,
};
const told = (...given: Parameters<typeof uncertaintyBudget>) =>
  uncertaintyBudget(...given).map(({ source, fields, within, ofRatio, share }) => [
    source,
    fields.join(' '),
    Number(within.toFixed(4)),
    Number(ofRatio.toFixed(4)),
    Number(share.toFixed(4)),
  ]);
const standard = DEMO_STANDARD;

describe('what the ± of a fill ratio comes from', () => {
  it('set: by hand from the derivatives of V = π/4·D²·h − π/12·h·(d₁² + d₁d₂ + d₂²)', () => {
    // u_V: bore 0.25·π·20·72/2, pole 0.1·π·6·3·(d₁ + d₂), depths 0.5·(100π − 106.077), each over 1728 in³; yield 3 %.
    expect(told('set', { values: POLE, standard, fillRatio: 9.5 / 8.6701 })).toEqual([
      ['bore', 'boreTopIn', 0.5, 0.0827, 0.5815],
      ['yield', '', 0.06, 0.0657, 0.3674],
      ['pole', 'girthGroundLineIn girthButtIn', 0.2, 0.0192, 0.0314],
      ['depth', 'boreDepthFt embedmentFt', 1, 0.0152, 0.0197],
    ]);
    // 0.0827² + 0.0657² + 0.0192² + 0.0152² = 0.1085²: the uncertainty of the worked record.
  });

  it('straighten: gap 0.125/4, width 0.1/11, depth 0.5/54, yield 3 % (WR-17)', () => {
    const values = {
      poleMaterial: 'southern-pine',
      diameterGroundLineIn: 11,
      gapAtGradeIn: 4,
      gapDepthFt: 4.5,
    };
    expect(told('straighten', { values, standard, fillRatio: 1.5 / 0.6875 })).toMatchObject([
      ['gap', 'gapAtGradeIn', 0.25, 0.1364, 0.4776],
      ['yield', '', 0.06, 0.1309, 0.4401],
      ['depth', 'gapDepthFt', 1, 0.0404, 0.0419],
      ['width', 'diameterGroundLineIn', 0.2, 0.0397, 0.0404],
    ]);
  });

  it('re-level: gaps 0.125/2, yield 3 %', () => {
    const values = { padLengthIn: 40, padWidthIn: 40, gap1In: 2, gap2In: 2, gap3In: 2, gap4In: 2 };
    expect(told('relevel', { values, standard, fillRatio: 1.35 })).toEqual([
      ['gap', 'gap1In gap2In gap3In gap4In', 0.25, 0.1688, 0.8127],
      ['yield', '', 0.06, 0.081, 0.1873],
    ]);
  });

  it('nothing where there is no ratio, no void, or nothing uncertain', () => {
    expect(uncertaintyBudget('set', { values: POLE, standard, fillRatio: null })).toEqual([]);
    expect(uncertaintyBudget('set', { values: {}, standard, fillRatio: 1 })).toEqual([]);
    const values = { padLengthIn: 40, padWidthIn: 40, gap1In: 0, gap2In: 0, gap3In: 0, gap4In: 0 };
    expect(uncertaintyBudget('relevel', { values, standard, fillRatio: 1 })).toEqual([]);
    const exact = { boreIn: 0, poleTapedIn: 0, poleTableIn: 0, depthIn: 0, gapIn: 0, placedShare: 0 };
    expect(
      uncertaintyBudget('set', { values: POLE, standard: { ...standard, uncertainty: exact }, fillRatio: 1 }),
    ).toEqual([]);
  });
});

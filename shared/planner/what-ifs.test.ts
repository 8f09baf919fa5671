import { describe, expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { PLAN_DEFAULTS } from './plan-fields.ts';
import { planOne } from './plan-one.ts';
import { readPlan } from './read-plan.ts';
import { rockWhatIfs } from './rock-what-ifs.ts';
import { mostOpenWaterIn, waterAnswer, waterWhatIfs } from './water-answer.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
const TWELVE = { ...PLAN_DEFAULTS, boreIn: '18', diameterGroundLineIn: '12', diameterButtIn: '12' };

describe('water', () => {
  const { values } = planOne(TWELVE, CONTEXT);

  it('rises with the pole in', () => {
    // WR-08 (and the trade's own example): 18 in bore, 12 in butt, factor 1.8: 1.2 in stands at 2.16 in, over 2 in.
    const answer = waterAnswer(values, 1.2, DEMO_STANDARD);
    expect(answer.withPoleIn).toBeCloseTo(2.16, 6);
    expect(answer.over).toBe(true);
    expect(waterAnswer(values, 1, DEMO_STANDARD).over).toBe(false);
  });

  it('may stand so deep in the open bore, and no deeper', () => {
    // 2 in ÷ 1.8.
    expect(mostOpenWaterIn(values, DEMO_STANDARD)).toBeCloseTo(2 / 1.8, 6);
    // Over-dig of 6 in without a bed: 2 in open stay 2 in, below the butt.
    const dug = planOne({ ...TWELVE, overDigFt: '0.5' }, CONTEXT).values;
    expect(mostOpenWaterIn(dug, DEMO_STANDARD)).toBeCloseTo(2, 6);
    // A crushed-stone bed of 6 in leaves 0.4 of itself to the water: 2 in with it in was 0.8 in open.
    const bed = planOne({ ...TWELVE, overDigFt: '0.5', bedMaterial: 'crushed-stone' }, CONTEXT).values;
    expect(mostOpenWaterIn(bed, DEMO_STANDARD)).toBeCloseTo(0.8, 6);
  });

  it('has a row for each depth that the bore can hold', () => {
    expect(waterWhatIfs(values, DEMO_STANDARD).map(({ openIn, over }) => [openIn, over])).toEqual([
      [1, false],
      [2, true],
      [3, true],
      [6, true],
      [12, true],
    ]);
  });
});

describe('rock', () => {
  it('changes the depth due by the standard’s rule', () => {
    // 45 ft: soil 6.5 ft, rock 4.5 ft (line handbooks). Rock from r ≤ 2 ft: min(r + 4.5, 6.5); deeper: 6.5 (recalled practice).
    const reading = readPlan({ ...PLAN_DEFAULTS, poleLengthFt: '45', poleClass: '3', boreIn: '20' });
    expect(rockWhatIfs(reading, CONTEXT).map(({ met, dueFt }) => [met, dueFt])).toEqual([
      ['soil', 6.5],
      [1, 5.5],
      [2, 6.5],
      [3, 6.5],
      [4, 6.5],
      ['rock', 4.5],
    ]);
    // A bore of 24 in or more in rock is filled like one in soil.
    const wide = readPlan({ ...PLAN_DEFAULTS, poleLengthFt: '45', poleClass: '3', boreIn: '24' });
    expect(rockWhatIfs(wide, CONTEXT).at(-1)?.dueFt).toBe(6.5);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { waterWithPoleOf } from './water-with-pole.ts';

const POROSITY = 0.4;
const set = {
  boreTopIn: 18,
  boreDepthFt: 6,
  embedmentFt: 6,
  diameterGroundLineIn: 12,
  diameterButtIn: 12,
  waterIn: 1.2,
};

describe('water with the pole in', () => {
  // An 18 in bore with a 12 in butt on its bottom: 18²/(18² − 12²) = 1.8.
  test('stands 1.8 times as high', () => {
    expect(waterWithPoleOf(set, POROSITY)).toBeCloseTo(2.16, 9);
  });

  test('stays below a pole that does not reach it', () => {
    expect(waterWithPoleOf({ ...set, boreDepthFt: 6.5, waterIn: 3 }, POROSITY)).toBeCloseTo(3, 9);
  });

  test('is as measured with the pole in, whatever else is missing', () => {
    expect(waterWithPoleOf({ waterIn: 3, waterMeasured: 'with-pole' }, POROSITY)).toBe(3);
    expect(waterWithPoleOf({ waterIn: 0 }, POROSITY)).toBe(0);
  });

  test('is lifted whole by a native bed: 6 in of bed and 1.2 in × 1.8 beside the pole', () => {
    const values = { ...set, boreDepthFt: 6.5, bedMaterial: 'native', bedFt: 0.5 };
    expect(waterWithPoleOf(values, POROSITY)).toBeCloseTo(8.16, 9);
  });

  // An open pole of 12 in with a 0.5 in wall takes 12² − 11² = 23 of 324: factor 324/301.
  test('rises little beside an open pole', () => {
    expect(waterWithPoleOf({ ...set, buttEnd: 'open', wallIn: 0.5 }, POROSITY)).toBeCloseTo(
      (1.2 * 324) / 301,
      9,
    );
  });

  test('cannot pass grade', () => {
    expect(waterWithPoleOf({ ...set, waterIn: 60 }, POROSITY)).toBeCloseTo(72, 9);
    expect(waterWithPoleOf({ ...set, waterIn: 400 }, POROSITY)).toBeCloseTo(72, 9);
  });

  test('is not known when not measured or the bore is not known', () => {
    expect(waterWithPoleOf({ ...set, waterIn: 'not-measured' }, POROSITY)).toBeNull();
    expect(waterWithPoleOf({ waterIn: 2 }, POROSITY)).toBeNull();
  });

  test('never stands lower than in the open bore, and rises with it', () => {
    const depth = fc.double({ min: 0, max: 71, noNaN: true });
    fc.assert(
      fc.property(depth, depth, (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        const at = (waterIn: number) => waterWithPoleOf({ ...set, waterIn }, POROSITY) ?? Number.NaN;
        expect(at(low)).toBeGreaterThanOrEqual(low - 1e-9);
        expect(at(high)).toBeGreaterThanOrEqual(at(low) - 1e-9);
      }),
    );
  });
});

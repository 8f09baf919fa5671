import fc from 'fast-check';
import { expect, test } from 'vitest';
import { leanDeviation, type Lean } from './lean.ts';

const lean = (inPer10Ft: number, azimuthDeg: number | null = null): Lean => ({ inPer10Ft, azimuthDeg });

test.each([
  ['opposite directions add', lean(2, 0), lean(2, 180), 4],
  ['the same direction cancels', lean(2, 350), lean(2, 350), 0],
  // 3-4-5: north 3, east 4.
  ['a right angle', lean(3, 0), lean(4, 90), 5],
  ['a small lean without a direction is taken against the rake', lean(0.2), lean(2, 90), 2.2],
  ['a small rake without a direction likewise', lean(1, 10), lean(0.25), 1.25],
  ['both without', lean(0.2), lean(0.1), 0.3],
  ['no rake', lean(0.8, 45), lean(0), 0.8],
])('%s', (_what, a, b, deviation) => {
  expect(leanDeviation(a, b)).toBeCloseTo(deviation, 9);
});

test('a lean that needs its direction and lacks it gives none', () => {
  expect(leanDeviation(lean(0.26), lean(0))).toBeNull();
  expect(leanDeviation(lean(0.1), lean(2))).toBeNull();
  expect(leanDeviation(lean(Number.NaN, 0), lean(0))).toBeNull();
  expect(leanDeviation(lean(-1, 0), lean(0))).toBeNull();
});

test('lies between difference and sum of the amounts, either way round', () => {
  const any = fc.record({
    inPer10Ft: fc.double({ min: 0, max: 20, noNaN: true }),
    azimuthDeg: fc.double({ min: 0, max: 360, noNaN: true }),
  });
  fc.assert(
    fc.property(any, any, (a, b) => {
      const deviation = leanDeviation(a, b) ?? Number.NaN;
      expect(deviation).toBeLessThanOrEqual(a.inPer10Ft + b.inPer10Ft + 1e-9);
      expect(deviation).toBeGreaterThanOrEqual(Math.abs(a.inPer10Ft - b.inPer10Ft) - 1e-9);
      expect(leanDeviation(b, a)).toBeCloseTo(deviation, 9);
    }),
  );
});

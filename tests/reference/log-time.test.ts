import { expect, test } from 'vitest';
import { logInterpolate, logInterpolateTime } from '#shared/calc/strength-share.ts';

// Source: straight line in log t, exact arithmetic. Status: derived.
test.each([
  [1, 10, 100, 30, 10, 20],
  [15, 20, 60, 50, 30, 35],
  [1, 0, 24, 100, 8, 65.4312875957],
  [4, 0, 25, 1, 10, 0.5],
])('between (%d, %d) and (%d, %d), at %d: %d', (t1, y1, t2, y2, t, y) => {
  expect(Math.abs(logInterpolate([t1, y1], [t2, y2], t) / y - 1)).toBeLessThan(1e-10);
});

test.each([
  [1, 10, 100, 30, 20, 10],
  [15, 20, 60, 50, 35, 30],
])('between (%d, %d) and (%d, %d), %d is reached at %d', (t1, y1, t2, y2, y, t) => {
  expect(Math.abs(logInterpolateTime([t1, y1], [t2, y2], y) / t - 1)).toBeLessThan(1e-10);
});

// Source: check points of common practice: half after 3 min, 0.8 after 60 min; 15 min reads 0.66.
test('0.66 after 15 min', () => {
  expect(logInterpolate([3, 0.5], [60, 0.8], 15)).toBeCloseTo(0.66, 2);
});

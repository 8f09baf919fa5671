import { expect, it } from 'vitest';
import { rateScale } from './rate-scale.ts';

it.each([
  [0, 0.02],
  [0.049, 0.05],
  [0.19, 0.2],
  [0.51, 1],
  [1, 1],
])('an axis that holds %d ends at %d', (high, end) => {
  expect(rateScale(high)).toEqual({ end, ticks: [0, end / 2, end] });
});

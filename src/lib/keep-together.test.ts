import { expect, it } from 'vitest';
import { keepTogether } from './keep-together.ts';

it('keeps a figure with its unit, and an uncertainty with its figure', () => {
  expect(keepTogether('4.00 ft³ of foam for a void of 5.51 ft³. Uncertainty ± 0.09 (k = 2).')).toBe(
    '4.00\u00a0ft³ of foam for a void of 5.51\u00a0ft³. Uncertainty ±\u00a00.09 (k\u00a0=\u00a02).',
  );
});

it('leaves words alone', () => {
  expect(keepTogether('Pour 1 is for structure S-77, 2 into 5 inside')).toBe(
    'Pour 1 is for structure S-77, 2 into 5 inside',
  );
});

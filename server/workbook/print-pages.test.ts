import { expect, it } from 'vitest';
import { pagesAcross } from './print-pages.ts';

it.each([
  [[], 1],
  [[17, 13, 40], 1],
  // 50 columns of 15: 750 widths of a figure, of which a readable page holds 190.
  [Array<number>(50).fill(15), 4],
])('pages across for %j', (widths, pages) => {
  expect(pagesAcross(widths)).toBe(pages);
});

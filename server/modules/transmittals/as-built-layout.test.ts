import { expect, it } from 'vitest';
import { numberFormat, rowHeight } from './as-built-layout.ts';

it('a row is as high as its longest wrapped text: 15 pt a line', () => {
  expect(rowHeight([{ text: 'short', width: 48 }])).toBeUndefined();
  // 100 characters in a column of 48 widths: three lines.
  expect(rowHeight([{ text: 'x'.repeat(100), width: 48 }])).toBe(45);
  expect(rowHeight([{ text: 'one\ntwo', width: 48 }])).toBe(30);
  expect(rowHeight([{ text: 'x'.repeat(10_000), width: 48 }])).toBe(180);
});

it('two digits for what was computed, all for what was read', () => {
  expect(numberFormat('fillRatio', 0.7932556412)).toBe('0.00');
  // 0.1 + 0.2 as a double is no reading of seventeen digits.
  expect(numberFormat('waterWithPoleIn', 0.30000000000000004)).toBe('0.00');
  expect(numberFormat('embedmentFt', 6.125)).toBeNull();
  expect(numberFormat('latitude', 41.904123)).toBeNull();
});

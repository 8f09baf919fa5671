import { expect, it } from 'vitest';
import { rawText } from './raw-text.ts';
import type { Cell } from './types.ts';

const cell = (more: Partial<Cell>): Cell => ({ address: 'A1', column: 1, kind: 'number', raw: '', ...more });
const text = (more: Partial<Cell>): string => rawText(cell(more), { date1904: false });

// Serial 46126 is 2026-04-14 in the 1900 system.
it('shows a cell as its writer saw it', () => {
  expect(text({ kind: 'text', raw: ' 18 1/2 ' })).toBe(' 18 1/2 ');
  expect(text({ raw: '6.0999999999999996', number: 6.1 })).toBe('6.1');
  expect(text({ number: 46_126, dateFormat: true })).toBe('2026-04-14');
  expect(text({ number: 46_126, dateFormat: true, timeFormat: true })).toBe('2026-04-14 00:00');
  expect(text({ number: 46_126 + 37_470 / 86_400, dateFormat: true, timeFormat: true })).toBe(
    '2026-04-14 10:24:30',
  );
  expect(text({ number: 0.5, dateFormat: true, timeFormat: true })).toBe('12:00');
  expect(text({ number: -1, dateFormat: true })).toBe('-1');
});

import type { Cell } from '#shared/workbook/types.ts';
import { readCell } from './read-cell.ts';
import type { ReadField, Reading } from './reading.ts';

export const field = (read: string, more: Partial<ReadField> = {}): ReadField => ({
  key: 'x',
  read,
  unit: null,
  allowed: null,
  words: [],
  ...more,
});
export const FEET = field('length-ft', { unit: 'ft' });
export const INCHES = field('length-in', { unit: 'in' });
export const LEAN = field('length-in', { unit: 'in-per-10ft' });
export const KIT = field('number', { unit: 'ft3' });
export const COUNT = field('integer', { unit: 'count' });
export const TEMPERATURE = field('temperature-f', { unit: 'degF' });
export const CLASS = field('code', { allowed: ['H1', '3', '10', 'other'] });
export const TEXT = field('text');

export const textCell = (raw: string): Cell => ({ address: 'A1', column: 1, kind: 'text', raw });
export const numberCell = (number: number, more: Partial<Cell> = {}): Cell => ({
  address: 'A1',
  column: 1,
  kind: 'number',
  raw: String(number),
  number,
  ...more,
});
export const SYSTEM = { date1904: false };

/** The value, or `why`, or the code of the problem. */
export function short(reading: Reading): unknown {
  if ('value' in reading) return reading.value;
  return reading.problem.params['why'] ?? reading.problem.code;
}
export const read = (raw: string, as: ReadField): unknown => short(readCell(textCell(raw), as, SYSTEM));

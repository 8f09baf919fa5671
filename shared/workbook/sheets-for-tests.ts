import { readSource } from './read-source.ts';
import type { Cell, Row, Sheet, Workbook } from './types.ts';
import { cellAddress } from './xml/cell-address.ts';

export type Input = string | number | boolean | null | Partial<Cell>;

export function cellOf(row: number, column: number, input: Exclude<Input, null>): Cell {
  const at = { address: cellAddress(row, column), column };
  if (typeof input === 'object') return { ...at, kind: 'text', raw: '', ...input };
  if (typeof input === 'number') return { ...at, kind: 'number', raw: String(input), number: input };
  if (typeof input === 'boolean') return { ...at, kind: 'boolean', raw: input ? 'TRUE' : 'FALSE' };
  return { ...at, kind: 'text', raw: input };
}

/** A sheet from rows of inputs, from row 1; null cells and empty rows are left out as the reader leaves them out. */
export function sheetOf(
  name: string,
  lines: readonly (readonly Input[])[],
  more: Partial<Sheet> = {},
): Sheet {
  const rows = lines.map((line, index): Row => ({
    row: index + 1,
    cells: line.flatMap((input, at) => (input === null ? [] : [cellOf(index + 1, at + 1, input)])),
  }));
  return {
    name,
    kind: 'worksheet',
    hidden: false,
    merged: [],
    rows: rows.filter((row) => row.cells.length > 0),
    ...more,
  };
}

export const BATCH = sheetOf('Batch', [
  ['workOrder', 'Work order', 'WO-7'],
  ['contractor', 'Contractor', 'Pike Line'],
  ['foreman', 'Foreman', 'Jo'],
  ['templateVersion', 'Template version', 2],
]);
export const workbook = (sheets: readonly Sheet[], more: Partial<Workbook> = {}): Workbook => ({
  date1904: false,
  keywords: null,
  sheets: [BATCH, ...sheets],
  ...more,
});
export const KEYS = ['structureNumber', 'poleLengthFt', 'boreTopIn', 'waterIn', 'setAt'];
export const TITLES = [
  'Structure number *',
  'Pole length (ft) *',
  'Bore at top (in) *',
  'Water (in) *',
  'Set *',
];
export const HINTS = [
  'As on the work order.',
  'Whole length, butt to top.',
  'Diameter at grade.',
  null,
  'When the pole stood in the bore.',
];
export const LINE = ['12', 45, '18 1/2', 'not measured', '2026-04-14 10:24'];
export const VALUES = {
  structureNumber: '12',
  poleLengthFt: 45,
  boreTopIn: 18.5,
  waterIn: 'not-measured',
  setAt: '2026-04-14T10:24',
};
export const codes = (book: Workbook): string[] => readSource(book).notices.map((one) => one.code);

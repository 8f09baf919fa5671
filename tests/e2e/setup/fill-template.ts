import { readFileSync } from 'node:fs';
import { read, utils, write, type CellObject, type WorkSheet } from '@e965/xlsx';
import type { RowInput } from '#server/workbook/write-workbook.ts';

const MS_PER_DAY = 86_400_000;
/** Serial day 0 of Excel's 1900 system for days after February 1900 (ECMA-376-1 18.17.4.1). */
const DAY_0 = Date.UTC(1899, 11, 30);
const FIRST_ROW = 3;
const WALL = /^\d{4}-\d\d-\d\d(?:T\d\d:\d\d)?$/;

/**
 * The downloaded template with these rows filled in as a crew would: on `Set` beside the structure's own row, on `Pours`
 * from the first row down. Keys in row 1 say which column is which. Another library than the product's writes it.
 */
export function fillTemplate(
  path: string,
  rows: { set: readonly RowInput[]; pours: readonly RowInput[] },
): Buffer {
  const book = read(readFileSync(path), { cellStyles: true, cellNF: true });
  const set = sheetOf(book.Sheets['Set']);
  const column = keysOf(set);
  const structures = column.get('structureNumber') ?? 0;
  for (const values of rows.set) {
    const row = findRow(set, structures, String(values['structureNumber']));
    writeRow(set, row, values);
  }
  const pours = sheetOf(book.Sheets['Pours']);
  rows.pours.forEach((values, index) => writeRow(pours, FIRST_ROW + index, values));
  const batch = sheetOf(book.Sheets['Batch']);
  fillNamed(batch, 'foreman', 'Dana Wells');
  return write(book, { type: 'buffer', bookType: 'xlsx', cellStyles: true }) as Buffer;
}

function sheetOf(sheet: WorkSheet | undefined): WorkSheet {
  if (!sheet) throw new Error('The template lacks a sheet.');
  return sheet;
}

function keysOf(sheet: WorkSheet): Map<string, number> {
  const { e: end } = utils.decode_range(sheet['!ref'] ?? 'A1');
  const keys = new Map<string, number>();
  for (let c = 0; c <= end.c; c++) {
    const cell = sheet[utils.encode_cell({ r: 0, c })] as CellObject | undefined;
    if (typeof cell?.v === 'string') keys.set(cell.v, c);
  }
  return keys;
}

function findRow(sheet: WorkSheet, column: number, text: string): number {
  const { e: end } = utils.decode_range(sheet['!ref'] ?? 'A1');
  for (let r = FIRST_ROW; r <= end.r; r++) {
    const cell = sheet[utils.encode_cell({ r, c: column })] as CellObject | undefined;
    if (String(cell?.v) === text) return r;
  }
  throw new Error(`The template has no row of ${text}.`);
}

function writeRow(sheet: WorkSheet, row: number, values: RowInput): void {
  const column = keysOf(sheet);
  for (const [key, value] of Object.entries(values)) {
    const c = column.get(key);
    if (c === undefined) throw new Error(`The template has no column ${key}.`);
    utils.sheet_add_aoa(sheet, [[cellOf(value)]], { origin: { r: row, c } });
  }
}

function cellOf(value: RowInput[string]): CellObject | null {
  if (value === null || value === undefined) return null;
  if (typeof value === 'number') return { t: 'n', v: value };
  if (typeof value === 'boolean') return { t: 'b', v: value };
  if (!WALL.test(value)) return { t: 's', v: value };
  const timed = value.includes('T');
  const serial = (Date.parse(`${timed ? value : `${value}T00:00`}:00Z`) - DAY_0) / MS_PER_DAY;
  return { t: 'n', v: serial, z: timed ? 'yyyy-mm-dd hh:mm' : 'yyyy-mm-dd' };
}

/** The sheet `Batch` has its keys in the first column and its values in the third. */
function fillNamed(sheet: WorkSheet, key: string, value: string): void {
  const rows = utils.sheet_to_json<unknown[]>(sheet, { header: 1, blankrows: true });
  const at = rows.findIndex(([name]) => name === key);
  if (at < 0) throw new Error(`The template does not ask for ${key}.`);
  utils.sheet_add_aoa(sheet, [[value]], { origin: { r: at, c: 2 } });
}

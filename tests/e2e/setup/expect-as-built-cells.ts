import { read, utils, type WorkSheet } from '@e965/xlsx';
import { expect } from 'vitest';

/** Cells of the issued workbook against what was entered and decided above, read by another library. */
export function expectAsBuiltCells(
  bytes: Buffer,
  entered: { structures: readonly string[]; lot: string },
): void {
  const book = read(bytes);
  expect(book.SheetNames).toEqual(['Cover', 'Set', 'Straighten', 'Re-level', 'Pours', 'Events', 'Findings']);
  const set = dataOf(book.Sheets['Set']);
  // Worked record WR-01 gives the void of 8.6701 ft³; 9.5 ft³ were placed.
  expect(set.map((row) => [row['structureNumber'], row['embedmentFt'], row['conforms']])).toEqual([
    ['L-1', 6, 'yes'],
    ['L-2', 6, 'yes'],
    ['L-3', 5.75, 'yes'],
    ['L-4', 5.5, 'no'],
  ]);
  // Excel serial of 2026-04-14 10:05: day 46126 (1900 system) and 605/1440 of a day.
  for (const row of set) expect(row['letGoAt']).toBeCloseTo(46126 + 605 / 1440, 6);
  const pours = dataOf(book.Sheets['Pours']);
  // Both kits of a pole are one pour, so their order says nothing.
  const poured = pours.map((row) => [row['structureNumber'], row['lot'], row['kitFt3']]);
  expect(poured).toHaveLength(8);
  expect(poured).toEqual(
    expect.arrayContaining(
      entered.structures.flatMap((structure) => [
        [structure, entered.lot, 8],
        [structure, entered.lot, 1.5],
      ]),
    ),
  );
  expect(dataOf(book.Sheets['Findings'])).toMatchObject([
    { structureNumber: 'L-3', code: 'embedment-short', measured: 5.75, limit: 6, grounds: 'evidence' },
    { structureNumber: 'L-4', measured: 5.5, limit: 6, grounds: 'concession', concession: 'C-0001' },
  ]);
  const cover = utils.sheet_to_json<unknown[]>(sheetOf(book.Sheets['Cover']), { header: 1 });
  const said = Object.fromEntries(cover.map(([key, , value]) => [key, value]));
  expect(said).toMatchObject({ transmittal: 'T-0001', revision: 0, 'count:Set': 4, nonconforming: 1 });
}

/** Keys in row 1, data from row 4. */
const dataOf = (sheet: WorkSheet | undefined): Record<string, unknown>[] =>
  utils.sheet_to_json<Record<string, unknown>>(sheetOf(sheet), { raw: true }).slice(2);

function sheetOf(sheet: WorkSheet | undefined): WorkSheet {
  if (!sheet) throw new Error('The issued workbook lacks a sheet.');
  return sheet;
}

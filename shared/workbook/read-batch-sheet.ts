import type { CellProblem, CellSource, Scalar, SourceRow } from '#shared/records/types.ts';
import { readCell } from './cells/read-cell.ts';
import { type Column, nameKey, sheetLayout } from './layout.ts';
import { rawText } from './raw-text.ts';
import type { Cell, Row, Sheet } from './types.ts';

const VALUE_COLUMN = 3;
/** Further down stands nothing of ours. */
const SEARCHED_ROWS = 100;

/** The field that a row of the Batch sheet is about, and the cell with its value: column C beside a key, else the first cell after a title. */
function entryOf(row: Row, columns: readonly Column[]): { column: Column; cell: Cell | undefined } | null {
  for (const set of ['keys', 'names'] as const) {
    for (const label of row.cells) {
      if (label.kind !== 'text') continue;
      const column = columns.find((one) =>
        set === 'keys' ? one.keys.has(label.raw.trim()) : one.names.has(nameKey(label.raw)),
      );
      if (column === undefined) continue;
      const cell = row.cells.find((one) =>
        set === 'keys' && label.column === 1 ? one.column === VALUE_COLUMN : one.column > label.column,
      );
      return { column, cell };
    }
  }
  return null;
}

/** The Batch sheet as one row of values, each with its own cell; an absent sheet gives an empty row. */
export function readBatchSheet(sheet: Sheet | null, system: { readonly date1904: boolean }): SourceRow {
  const { name, columns } = sheetLayout('batch');
  const values: Record<string, Scalar> = {};
  const cells: Record<string, CellSource> = {};
  const problems: CellProblem[] = [];
  let first: number | null = null;
  for (const row of sheet?.rows ?? []) {
    const entry = row.row > SEARCHED_ROWS ? null : entryOf(row, columns);
    if (entry === null) continue;
    first ??= row.row;
    const { column, cell } = entry;
    // The first row about a field counts.
    if (cell === undefined || Object.hasOwn(cells, column.key)) continue;
    const reading = readCell(cell, column, system);
    if ('value' in reading && reading.value === null) continue;
    const source = { address: cell.address, raw: rawText(cell, system) };
    cells[column.key] = source;
    if ('value' in reading) values[column.key] = reading.value;
    else problems.push({ field: column.key, ...source, ...reading.problem });
  }
  return { sheet: name, row: first ?? 1, values, cells, problems };
}

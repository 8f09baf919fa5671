import type { Cell, Row } from './types.ts';
import { trimText } from './cells/clean-text.ts';
import { readCell } from './cells/read-cell.ts';
import { type Column, nameKey, type SheetLayout } from './layout.ts';

/** The row of keys (or titles) is looked for in these first rows. */
const SEARCHED_ROWS = 20;

export type Header = {
  /** Known columns by column number. */
  readonly columns: ReadonlyMap<number, Column>;
  /** Headings of columns that no template version knows, by column number. */
  readonly unknown: ReadonlyMap<number, Cell>;
  /** Cells that head a column a second time. */
  readonly twice: readonly { readonly cell: Cell; readonly column: Column }[];
  readonly row: number;
  /** First row that can be data. */
  readonly dataFrom: number;
  /** Rows between heading and data that are neither blank, titles nor hints. */
  readonly skipped: readonly number[];
};

function columnNamed(layout: SheetLayout, cell: Cell): Column | undefined {
  if (cell.kind !== 'text') return undefined;
  const name = nameKey(cell.raw);
  return name === '' ? undefined : layout.columns.find((column) => column.names.has(name));
}

const hits = (layout: SheetLayout, row: Row): number =>
  new Set(row.cells.map((cell) => columnNamed(layout, cell)).filter(Boolean)).size;

/** The first row with the most keys or titles; one lone match is chance. */
function headingRow(layout: SheetLayout, rows: readonly Row[]): Row | null {
  let best: Row | null = null;
  let most = 1;
  for (const row of rows) {
    const count = row.row > SEARCHED_ROWS ? 0 : hits(layout, row);
    if (count > most) [best, most] = [row, count];
  }
  return best;
}

/** Keys stand exactly as the schemas write them, titles do not. */
function isKeyRow(layout: SheetLayout, row: Row): boolean {
  const keys = row.cells.filter((cell) => layout.columns.some((column) => column.keys.has(cell.raw.trim())));
  return keys.length * 2 > hits(layout, row);
}

const isFilled = (cell: Cell): boolean => cell.kind === 'error' || trimText(cell.raw) !== '';

/** Titles and hints of the template, as against what a crew writes: most cells say what a heading says. */
function isHeading(row: Row, columns: ReadonlyMap<number, Column>): boolean {
  const cells = row.cells.filter((cell) => isFilled(cell) && columns.has(cell.column));
  const known = cells.filter((cell) => {
    const column = columns.get(cell.column)!;
    return column.names.has(nameKey(cell.raw)) || nameKey(column.description) === nameKey(cell.raw);
  });
  return known.length > 0 && known.length * 2 >= cells.length;
}

/** Most of the cells that are no free text read well: somebody's data directly under the headings. */
function isData(row: Row, columns: ReadonlyMap<number, Column>, date1904: boolean): boolean {
  const readings = row.cells.flatMap((cell) => {
    const column = columns.get(cell.column);
    return column === undefined || column.read === 'text' || !isFilled(cell)
      ? []
      : ['value' in readCell(cell, column, { date1904 })];
  });
  const read = readings.filter(Boolean).length;
  return read > 0 && read * 2 > readings.length;
}

/** Finds the headings of a sheet and where its data begins; null when there are none. Columns may stand in any order. */
export function findHeader(
  layout: SheetLayout,
  rows: readonly Row[],
  { date1904 }: { readonly date1904: boolean },
): Header | null {
  const found = headingRow(layout, rows);
  if (found === null) return null;
  const columns = new Map<number, Column>();
  const unknown = new Map<number, Cell>();
  const twice: { cell: Cell; column: Column }[] = [];
  const taken = new Set<string>();
  const head = (row: Row): void => {
    for (const cell of row.cells) {
      if (columns.has(cell.column) || !isFilled(cell)) continue;
      const column = columnNamed(layout, cell);
      if (column === undefined) {
        if (!unknown.has(cell.column)) unknown.set(cell.column, cell);
      } else if (taken.has(column.key)) twice.push({ cell, column });
      else {
        taken.add(column.key);
        columns.set(cell.column, column);
        unknown.delete(cell.column);
      }
    }
  };
  head(found);

  // Under a row of keys stand titles and hints, under a row of titles hints; some leave them out.
  const keys = isKeyRow(layout, found);
  let dataFrom = found.row + 1;
  const last = found.row + (keys ? 2 : 1);
  const skipped: number[] = [];
  for (const row of rows) {
    if (row.row < dataFrom || row.row > last) continue;
    if (!isHeading(row, columns)) {
      if (isData(row, columns, date1904)) break;
      if (row.cells.some((cell) => columns.has(cell.column) && isFilled(cell))) skipped.push(row.row);
    } else if (keys) head(row);
    dataFrom = row.row + 1;
  }
  return { columns, unknown, twice, row: found.row, dataFrom, skipped };
}

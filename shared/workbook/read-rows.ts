import type { CellProblem, CellSource, Scalar, SourceRow, WorkbookNotice } from '#shared/records/types.ts';
import { trimText } from './cells/clean-text.ts';
import { readCell } from './cells/read-cell.ts';
import { findHeader, type Header } from './find-header.ts';
import type { SheetLayout } from './layout.ts';
import { notice } from './notices.ts';
import { rawText } from './raw-text.ts';
import type { Row, Sheet } from './types.ts';
import { columnLetters, parseAddress } from './xml/cell-address.ts';

type Read = {
  readonly rows: readonly SourceRow[];
  readonly notices: readonly WorkbookNotice[];
  /** Letters of each known column by field. */
  readonly columns: Readonly<Record<string, string>>;
};
type DateSystem = { readonly date1904: boolean };

/** Merged ranges named one by one up to here. */
const NAMED_RANGES = 20;

/** Cells of columns that no template knows are kept under this name: a heading is data and never a key. */
const unknownName = (column: number): string => `column ${columnLetters(column)}`;

/** Reads one row; null when nothing but prefilled cells is filled. */
function readRow(layout: SheetLayout, row: Row, header: Header, system: DateSystem): SourceRow | null {
  const values: Record<string, Scalar> = {};
  const cells: Record<string, CellSource> = {};
  const problems: CellProblem[] = [];
  let filled = false;
  for (const cell of row.cells) {
    const column = header.columns.get(cell.column);
    const source = { address: cell.address, raw: rawText(cell, system) };
    if (column === undefined) {
      if (trimText(cell.raw) !== '') cells[unknownName(cell.column)] = source;
      continue;
    }
    const reading = readCell(cell, column, system);
    if ('value' in reading && reading.value === null) continue;
    filled ||= !column.prefilled;
    cells[column.key] = source;
    if ('value' in reading) values[column.key] = reading.value;
    else problems.push({ field: column.key, ...source, ...reading.problem });
  }
  return filled ? { sheet: layout.name, row: row.row, values, cells, problems } : null;
}

function headerNotices(layout: SheetLayout, header: Header, data: readonly Row[]): WorkbookNotice[] {
  const sheet = layout.name;
  const known = new Set([...header.columns.values()].map((column) => column.key));
  const missing = layout.columns.filter((column) => column.required && !known.has(column.key));
  const headings = new Map([...header.unknown].map(([column, cell]) => [column, cell.raw]));
  for (const row of data) {
    for (const cell of row.cells) {
      const stray = !header.columns.has(cell.column) && trimText(cell.raw) !== '';
      if (stray && !headings.has(cell.column)) headings.set(cell.column, '');
    }
  }
  const again = new Set(header.twice.map(({ cell }) => cell.column));
  return [
    ...missing.map(({ key, title }) => notice('workbook-column-missing', { sheet }, { field: key, title })),
    ...header.twice.map(({ cell, column }) =>
      notice(
        'workbook-column-twice',
        { sheet, address: cell.address },
        { field: column.key, title: column.title },
      ),
    ),
    ...[...headings]
      .filter(([column]) => !again.has(column))
      .sort(([a], [b]) => a - b)
      .map(([column, heading]) =>
        notice(
          'workbook-column-unknown',
          { sheet, address: header.unknown.get(column)?.address ?? null },
          { column: columnLetters(column), heading: trimText(heading).slice(0, 200) },
        ),
      ),
    ...header.skipped.map((row) => notice('workbook-row-skipped', { sheet, address: `A${row}` }, { row })),
  ];
}

function mergedNotices(layout: SheetLayout, sheet: Sheet, dataFrom: number): WorkbookNotice[] {
  const inData = sheet.merged.filter((range) => {
    const end = parseAddress(range.split(':').pop() ?? '');
    return end !== null && end.row >= dataFrom;
  });
  return inData.slice(0, NAMED_RANGES).map((range, index) => {
    const more = index === NAMED_RANGES - 1 ? inData.length - NAMED_RANGES : 0;
    return notice(
      'workbook-merged',
      { sheet: layout.name, address: range.split(':')[0] ?? null },
      { range, more },
    );
  });
}

/** Rows of one data sheet that carry more than what the template prefilled, with what is to be said about the sheet. */
export function readRows(layout: SheetLayout, sheet: Sheet, system: DateSystem): Read {
  if (sheet.rows.length === 0) return { rows: [], notices: [], columns: {} };
  const header = findHeader(layout, sheet.rows, system);
  if (header === null)
    return { rows: [], notices: [notice('workbook-header-missing', { sheet: layout.name })], columns: {} };
  const data = sheet.rows.filter((row) => row.row >= header.dataFrom);
  const rows = data.flatMap((row) => readRow(layout, row, header, system) ?? []);
  // Headings of a sheet that nobody used are nobody's concern.
  const said = rows.length === 0 && header.skipped.length === 0 ? [] : headerNotices(layout, header, data);
  const columns = Object.fromEntries([...header.columns].map(([at, { key }]) => [key, columnLetters(at)]));
  return { rows, columns, notices: [...said, ...mergedNotices(layout, sheet, header.dataFrom)] };
}

import type { SourceBatch, SourceRow } from '#shared/records/types.ts';

const COLUMN = /^[A-Z]{1,3}(?=\d)/;

/** Address of a field in a row: the cell read, or for a blank one the column where other rows of the sheet have it. */
export type CellFinder = (row: SourceRow, field: string | null) => string | null;

/** Goes over the workbook once. */
export const cellFinder = (source: SourceBatch): CellFinder => {
  const columns = new Map<string, string>();
  for (const row of [...source.lines, ...source.pours, ...source.events, ...source.photos]) {
    for (const [field, cell] of Object.entries(row.cells)) {
      const key = `${row.sheet}|${field}`;
      const column = columns.has(key) ? undefined : COLUMN.exec(cell.address)?.[0];
      if (column !== undefined) columns.set(key, column);
    }
  }
  return (row, field) => {
    if (field === null) return null;
    const problem = row.problems.find((one) => one.field === field);
    const cell = Object.hasOwn(row.cells, field) ? row.cells[field] : undefined;
    const address = cell?.address ?? problem?.address;
    if (address !== undefined && address !== null) return address;
    const column = source.columns?.[row.sheet]?.[field] ?? columns.get(`${row.sheet}|${field}`);
    return column === undefined ? null : `${column}${row.row}`;
  };
};

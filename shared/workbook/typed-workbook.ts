import type { Kind } from '#shared/records/types.ts';
import { HEADER_ROWS, type SheetLayout, sheetLayout, TEMPLATE_VERSION } from './layout.ts';
import type { Row, Sheet, Workbook } from './types.ts';
import { cellAddress } from './xml/cell-address.ts';

/** What was typed, by field key, exactly as typed. */
export type TypedValues = Readonly<Record<string, string>>;

export type TypedLine = {
  readonly kind: Kind;
  readonly values: TypedValues;
  readonly pours: readonly TypedValues[];
  /** For the Batch sheet, which a typed line has none of. */
  readonly batch: {
    readonly workOrder: string;
    readonly contractor: string;
    readonly foreman: string;
  };
};

const cell = (row: number, column: number, raw: string) => ({
  address: cellAddress(row, column),
  column,
  kind: 'text' as const,
  raw,
});

const filledRow = (layout: SheetLayout, row: number, values: TypedValues): Row => ({
  row,
  cells: layout.columns.flatMap(({ key }, index) => {
    const raw = values[key] ?? '';
    return raw.trim() === '' ? [] : [cell(row, index + 1, raw)];
  }),
});

const sheetOf = (layout: SheetLayout, rows: readonly Row[]): Sheet => ({
  name: layout.name,
  kind: 'worksheet',
  hidden: false,
  merged: [],
  rows,
});

function listSheet(layout: SheetLayout, filled: readonly TypedValues[]): Sheet {
  const keys: Row = {
    row: HEADER_ROWS.keys,
    cells: layout.columns.map(({ key }, index) => cell(HEADER_ROWS.keys, index + 1, key)),
  };
  return sheetOf(layout, [
    keys,
    ...filled.map((values, index) => filledRow(layout, HEADER_ROWS.data + index, values)),
  ]);
}

function batchSheet(values: TypedValues): Sheet {
  const layout = sheetLayout('batch');
  const rows = layout.columns.map(({ key }, index): Row => {
    const row = index + 1;
    const value = values[key];
    return { row, cells: [cell(row, 1, key), ...(value === undefined ? [] : [cell(row, 3, value)])] };
  });
  return sheetOf(layout, rows);
}

/** A line typed in a form as the workbook that would hold it, so that one code reads both. The line stands in row 4, its pours from row 4 down. */
export function typedWorkbook({ kind, values, pours, batch }: TypedLine): Workbook {
  const numbered = pours.map((pour) => ({ ...pour, structureNumber: values['structureNumber'] ?? '' }));
  return {
    date1904: false,
    keywords: null,
    sheets: [
      batchSheet({ ...batch, templateVersion: TEMPLATE_VERSION }),
      listSheet(sheetLayout(kind), [values]),
      listSheet(sheetLayout('pour'), numbered),
    ],
  };
}

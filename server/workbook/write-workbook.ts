import type { Writable } from 'node:stream';
import { formatKeywords } from '#shared/workbook/keywords.ts';
import { type Column, LAYOUT, type SheetLayout, TEMPLATE_VERSION } from '#shared/workbook/layout.ts';
import { DAY_FORMAT, serialOf, TIME_FORMAT } from './excel-time.ts';
import { type SheetWriter, streamWorkbook } from './workbook-writer.ts';

export type CellInput = string | number | boolean | null | undefined;
/** Values by field key, as the schemas have them; other keys become columns of their own. */
export type RowInput = Readonly<Record<string, CellInput>>;

export type WorkbookInput = {
  readonly workOrder: string;
  readonly contractor: string;
  readonly foreman: string;
  readonly templateVersion?: string;
  readonly notes?: string;
  readonly set?: readonly RowInput[];
  readonly straighten?: readonly RowInput[];
  readonly relevel?: readonly RowInput[];
  readonly pours?: readonly RowInput[];
  readonly events?: readonly RowInput[];
  readonly photos?: readonly RowInput[];
  /** False leaves out the row of keys, as a crew may that deletes what it cannot see. */
  readonly keys?: boolean;
};

type Written = { readonly value: string | number | boolean; readonly format?: string };

/** Times and days as real date-times, word-codes as words, all else as it is. */
function written(input: CellInput, column: Column | undefined): Written | null {
  if (input === null || input === undefined) return null;
  if (typeof input !== 'string' || column === undefined) return { value: input };
  if (column.read === 'clock' || column.read === 'day') {
    const serial = serialOf(input);
    if (serial !== null) return { value: serial, format: column.read === 'clock' ? TIME_FORMAT : DAY_FORMAT };
  }
  return { value: column.words.includes(input) ? input.replaceAll('-', ' ') : input };
}

function writeRows(sheet: SheetWriter, layout: SheetLayout, rows: readonly RowInput[], keys: boolean): void {
  const known = new Map(layout.columns.map((column) => [column.key, column]));
  const extra = rows.flatMap((row) => Object.keys(row)).filter((key) => !known.has(key));
  const order = [...new Set([...known.keys(), ...extra])];
  if (keys) {
    const row = sheet.addRow(order);
    row.hidden = true;
    row.commit();
  }
  sheet.addRow(order.map((key) => known.get(key)?.heading ?? key)).commit();
  sheet.addRow(order.map((key) => known.get(key)?.description ?? null)).commit();
  for (const values of rows) {
    const cells = order.map((key) =>
      Object.hasOwn(values, key) ? written(values[key], known.get(key)) : null,
    );
    const row = sheet.addRow(cells.map((cell) => cell?.value ?? null));
    cells.forEach((cell, index) => {
      if (cell?.format !== undefined) row.getCell(index + 1).numFmt = cell.format;
    });
    row.commit();
  }
}

function writeBatch(sheet: SheetWriter, layout: SheetLayout, values: RowInput): void {
  for (const column of layout.columns)
    sheet.addRow([column.key, column.title, values[column.key] ?? null]).commit();
}

/** Writes a filled-in workbook in the template's layout, without its looks: for seeds, the demo workbook and tests. */
export async function writeWorkbook(target: string | Writable, input: WorkbookInput): Promise<void> {
  const { workOrder, contractor, foreman, notes, keys = true, templateVersion = TEMPLATE_VERSION } = input;
  const rowsOf: Partial<Record<SheetLayout['record'], readonly RowInput[] | undefined>> = {
    set: input.set,
    straighten: input.straighten,
    relevel: input.relevel,
    pour: input.pours,
    event: input.events,
    photo: input.photos,
  };
  const keywords = formatKeywords(templateVersion, workOrder);
  await streamWorkbook(target, { keywords, title: `Work order ${workOrder}` }, (writer) => {
    for (const layout of LAYOUT) {
      const sheet = writer.addWorksheet(layout.name);
      if (layout.record === 'batch') {
        writeBatch(sheet, layout, { workOrder, contractor, foreman, templateVersion, notes });
      } else writeRows(sheet, layout, rowsOf[layout.record] ?? [], keys);
      sheet.commit();
    }
  });
}

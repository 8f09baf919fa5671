import { type Column, HEADER_ROWS, type SheetLayout } from '#shared/workbook/layout.ts';
import { columnLetters } from '#shared/workbook/xml/cell-address.ts';
import { DAY_FORMAT, TIME_FORMAT } from './excel-time.ts';
import type { TemplateLists } from './template-lists.ts';
import { ENTRY, HINT, PREFILLED, TITLE, TITLE_REQUIRED } from './template-style.ts';
import type { TemplateDesign } from './template-types.ts';
import { addValidation, type SheetWriter } from './workbook-writer.ts';

/** Rows ready to be filled in below the prefilled ones. */
const SPARE_ROWS = 500;

/** Text columns keep what is typed (3-14 stays 3-14); times show their full form. */
function formatOf(column: Column): string {
  if (column.read === 'clock') return TIME_FORMAT;
  if (column.read === 'day') return DAY_FORMAT;
  return column.read === 'text' || column.read === 'code' ? '@' : 'General';
}

export function widthOf(column: Column): number {
  if (column.key === 'notes') return 40;
  if (column.read === 'clock') return 18;
  return column.read === 'text' || column.read === 'code' ? 17 : 13;
}

/** Columns' formats and widths, to be set before the first row is written. */
export function prepareColumns(sheet: SheetWriter, layout: SheetLayout): void {
  sheet.columns = layout.columns.map((column) => ({
    width: widthOf(column),
    style: { ...ENTRY, numFmt: formatOf(column) },
  }));
}

function writeHeader(sheet: SheetWriter, columns: readonly Column[]): void {
  const keys = sheet.addRow(columns.map((column) => column.key));
  keys.hidden = true;
  keys.commit();
  const titles = sheet.addRow(columns.map((column) => `${column.heading}${column.required ? ' *' : ''}`));
  // Three lines: `Girth at ground line (in)` in a column for a figure.
  titles.height = 48;
  const hints = sheet.addRow(columns.map((column) => column.description));
  hints.height = 64;
  columns.forEach((column, index) => {
    Object.assign(titles.getCell(index + 1), column.required ? TITLE_REQUIRED : TITLE);
    Object.assign(hints.getCell(index + 1), HINT);
  });
  titles.commit();
  hints.commit();
}

function validate(
  sheet: SheetWriter,
  layout: SheetLayout,
  { lists, lastRow }: { lists: TemplateLists; lastRow: number },
): void {
  layout.columns.forEach((column, index) => {
    const letters = columnLetters(index + 1);
    const range = `${letters}${HEADER_ROWS.data}:${letters}${lastRow}`;
    const list = lists.rangeOf(layout, column);
    if (list !== null) {
      addValidation(sheet, range, {
        type: 'list',
        formulae: [list],
        // A lot that came this morning is on no list yet: a warning, not a wall. A code has no other spelling.
        errorStyle: column.allowed === null ? 'warning' : 'stop',
        error:
          column.allowed === null
            ? 'This is not on the list. Keep it if it is right.'
            : 'Choose one from the list.',
      });
    } else if (column.read === 'integer') {
      addValidation(sheet, range, {
        type: 'whole',
        formulae: [column.minimum ?? 0, column.maximum ?? 1_000_000],
        errorStyle: 'warning',
        error: `A whole number is expected: ${column.title.toLowerCase()}.`,
      });
    }
  });
}

/** One data sheet: hidden keys, titles with units, hints, prefilled rows, drop-downs. */
export function writeTemplateSheet(
  sheet: SheetWriter,
  layout: SheetLayout,
  { design, lists }: { readonly design: readonly TemplateDesign[]; readonly lists: TemplateLists },
): void {
  const { columns } = layout;
  writeHeader(sheet, columns);
  const planned = design.filter((one) => one.kind === layout.record);
  for (const one of planned) {
    const values = new Map<string, unknown>(Object.entries(one));
    const row = sheet.addRow([]);
    columns.forEach((column, index) => {
      const cell = row.getCell(index + 1);
      const known = column.prefilled ? values.get(column.key) : undefined;
      const filled = typeof known === 'string' || typeof known === 'number';
      Object.assign(cell, filled ? PREFILLED : ENTRY, { numFmt: formatOf(column) });
      if (filled) cell.value = known;
    });
    row.commit();
  }
  validate(sheet, layout, { lists, lastRow: HEADER_ROWS.data + planned.length + SPARE_ROWS });
}

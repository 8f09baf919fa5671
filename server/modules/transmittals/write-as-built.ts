import type { Writable } from 'node:stream';
import { serialOf, DAY_FORMAT, TIME_FORMAT } from '#server/workbook/excel-time.ts';
import { pagesAcross } from '#server/workbook/print-pages.ts';
import { HINT, TEXT, TITLE } from '#server/workbook/template-style.ts';
import { drained, streamWorkbook, type SheetWriter, type Writer } from '#server/workbook/workbook-writer.ts';
import type { ExportColumn } from '#shared/export/as-built-columns.ts';
import { exportValue, type ExportRow, type ExportValue } from '#shared/export/export-row.ts';
import { neutral } from '#shared/export/csv.ts';
import { columnLetters } from '#shared/workbook/xml/cell-address.ts';
import { columnWidth, fixedColumns, numberFormat, rowHeight, wraps } from './as-built-layout.ts';
import { writeCover, type Cover } from './write-cover.ts';
import type { ContentSheet } from './read-content.ts';

/** Rows between two words on progress. */
const BREATHE = 200;

/**
 * Writes an as-built: cover, one sheet a kind, pours, findings; keys in row 1 (hidden), data from row 4; print set-up.
 * `onRow` is told how many structures are written.
 */
export async function writeAsBuilt(
  target: Writable,
  options: { cover: Cover; sheets: readonly ContentSheet[]; onRow: (structures: number) => Promise<void> },
): Promise<void> {
  const { cover, sheets, onRow } = options;
  const head = {
    keywords: `transmittal=${cover.number}; revision=${cover.revision}; digest=${cover.digest}`,
    title: `${cover.number} ${cover.title}`,
  };
  await streamWorkbook(
    target,
    { ...head, sharedStrings: false, at: new Date(cover.issuedAt) },
    async (writer) => {
      writeCover(writer, cover);
      let structures = 0;
      for (const sheet of sheets) {
        const isKind = sheet.columns.some((column) => column.key === 'conforms');
        const written = openSheet(writer, sheet, cover);
        let n = 0;
        for await (const rows of sheet.chunks())
          for (const row of rows) {
            writeRow(written, sheet.columns, row);
            n += 1;
            await drained(written);
            if (isKind) structures += 1;
            if (n % BREATHE === 0) await onRow(structures);
          }
        written.commit();
      }
      await onRow(structures);
    },
  );
}

function openSheet(writer: Writer, sheet: ContentSheet, cover: Cover): SheetWriter {
  const fixed = fixedColumns(sheet.columns);
  const empty = cover.counts.get(sheet.name) === 0;
  const written = writer.addWorksheet(sheet.name, {
    views: [{ state: 'frozen', xSplit: fixed, ySplit: 3 }],
    pageSetup: {
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: empty ? 1 : pagesAcross(sheet.columns.map(columnWidth)),
      fitToHeight: 0,
      printTitlesRow: '2:2',
      printTitlesColumn: `A:${columnLetters(fixed)}`,
      margins: { left: 0.4, right: 0.4, top: 0.6, bottom: 0.6, header: 0.3, footer: 0.3 },
    },
    headerFooter: {
      oddHeader: `&L${sheet.name}&R${cover.number} revision ${cover.revision}`,
      oddFooter: `&L${cover.owner.replaceAll('&', '&&')}&RPage &P of &N`,
    },
  });
  written.columns = sheet.columns.map((column) => ({ width: columnWidth(column) }));
  const keys = written.addRow(sheet.columns.map((column) => column.key));
  keys.hidden = true;
  keys.commit();
  addStyled(
    written,
    sheet.columns.map((column) => column.heading),
    TITLE,
    48,
  );
  addStyled(
    written,
    sheet.columns.map((column) => column.hint),
    HINT,
    48,
  );
  return written;
}

function addStyled(sheet: SheetWriter, cells: readonly string[], style: object, height: number): void {
  const row = sheet.addRow([...cells]);
  row.height = height;
  row.eachCell({ includeEmpty: true }, (cell) => Object.assign(cell, { style }));
  row.commit();
}

function writeRow(sheet: SheetWriter, columns: readonly ExportColumn[], content: ExportRow): void {
  const values = columns.map((column) => exportValue(content, column.key));
  const row = sheet.addRow(columns.map((column, index) => cellOf(column, values[index])));
  const wrapped: { text: string; width: number }[] = [];
  columns.forEach((column, index) => {
    const value = values[index];
    const cell = row.getCell(index + 1);
    cell.alignment = { vertical: 'top', ...(wraps(column) ? TEXT.alignment : {}) };
    if (column.type === 'clock') cell.numFmt = TIME_FORMAT;
    if (column.type === 'day') cell.numFmt = DAY_FORMAT;
    const format = typeof value === 'number' ? numberFormat(column.key, value) : null;
    if (format !== null) cell.numFmt = format;
    if (wraps(column) && typeof value === 'string') wrapped.push({ text: value, width: columnWidth(column) });
  });
  const height = rowHeight(wrapped);
  if (height !== undefined) row.height = height;
  row.commit();
}

/** Real dates as serials, numbers as numbers; text never as a formula. */
function cellOf(column: ExportColumn, value: ExportValue): string | number | boolean | null {
  if (value === null || value === undefined) return null;
  if (typeof value !== 'string') return value;
  if (column.type === 'clock' || column.type === 'day')
    return serialOf(value) ?? neutral(value.replaceAll('-', ' '));
  return neutral(value);
}

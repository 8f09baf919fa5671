import type { ExportColumn } from '#shared/export/as-built-columns.ts';

/** Height of one line of text of 11 pt, in points. */
const LINE = 15;
/** The most lines that a row is made high for; a spreadsheet program allows no row over 409 pt. */
const MOST_LINES = 12;

const WIDE: ReadonlySet<string> = new Set(['sentence', 'reason', 'condition', 'notes']);
const WIDTHS: Readonly<Record<string, number>> = {
  code: 18,
  title: 24,
  severity: 15,
  decidedBy: 16,
  contractor: 24,
};

export const wraps = (column: ExportColumn): boolean => WIDE.has(column.key);

/** In widths of a figure. */
export function columnWidth(column: ExportColumn): number {
  if (wraps(column)) return 48;
  if (column.type === 'clock') return 17;
  return WIDTHS[column.key] ?? Math.min(26, Math.max(11, column.heading.length + 2));
}

/** How many columns stand still at the left, on the screen and on every page: up to the structure's number. */
export function fixedColumns(columns: readonly ExportColumn[]): number {
  return columns.findIndex((column) => column.key === 'structureNumber') + 1;
}

/** Points for a row whose wrapped texts are as given, each in a column of `width`; undefined: one line, as it comes. */
export function rowHeight(texts: readonly { text: string; width: number }[]): number | undefined {
  const lines = texts.map(({ text, width }) =>
    text.split('\n').reduce((sum, part) => sum + Math.max(1, Math.ceil(part.length / (width * 0.95))), 0),
  );
  const most = Math.min(MOST_LINES, Math.max(1, ...lines));
  return most > 1 ? most * LINE : undefined;
}

/** What was computed keeps its digits and shows two; what was read, and positions, show as they are. */
export function numberFormat(key: string, value: number): string | null {
  if (key === 'latitude' || key === 'longitude') return null;
  const [, decimals = ''] = String(value).split('.');
  return decimals.length > 3 ? '0.00' : null;
}

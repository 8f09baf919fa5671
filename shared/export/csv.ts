/**
 * Leading characters after which a spreadsheet may run a cell as a formula: the seven that the public guidance on CSV
 * injection names. Text that begins with one gets an apostrophe; numbers stay numbers.
 */
const RISKY = /^[=+\-@\t\r\n]/;

export type CsvCell = string | number | boolean | null | undefined;

/** One cell: quoted where it must be (RFC 4180), and never a formula. */
export function csvCell(value: CsvCell): string {
  if (value === null || value === undefined) return '';
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  const safe = neutral(value);
  return /[",\r\n]/.test(safe) || safe !== safe.trim() ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Text as it may stand in any exported cell, CSV or workbook. */
export const neutral = (text: string): string => (RISKY.test(text) ? `'${text}` : text);

/** One line with its CRLF. */
export const csvLine = (cells: readonly CsvCell[]): string => `${cells.map(csvCell).join(',')}\r\n`;

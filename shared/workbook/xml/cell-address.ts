export const LAST_ROW = 1_048_576;
export const LAST_COLUMN = 16_384;

/** `AA12` to row and column, both from 1; null when it is no address of a sheet. */
export function parseAddress(address: string): { row: number; column: number } | null {
  const match = /^([A-Za-z]{1,3})([1-9]\d{0,6})$/.exec(address);
  if (!match) return null;
  const [, letters = '', digits = ''] = match;
  let column = 0;
  for (const letter of letters.toUpperCase()) column = column * 26 + letter.charCodeAt(0) - 64;
  const row = Number(digits);
  return row > LAST_ROW || column > LAST_COLUMN ? null : { row, column };
}

/** Column number from 1 to its letters. */
export function columnLetters(column: number): string {
  let letters = '';
  for (let rest = column; rest > 0; rest = Math.floor((rest - 1) / 26)) {
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  }
  return letters;
}

export function cellAddress(row: number, column: number): string {
  return `${columnLetters(column)}${row}`;
}

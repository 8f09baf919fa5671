import { parseDay } from '#shared/dates/calendar-day.ts';
import { toSerial } from '#shared/dates/excel-serial.ts';
import type { Cell, Sheet, Workbook } from '#shared/workbook/types.ts';
import type { AgreedCell, AgreedWorkbook } from './agreed-cells.ts';

/** Half a millisecond, in days: agreed dates went through a clock with that step. */
const SAME_TIME = 0.5 / 86_400_000;
const ISO = /^(\d{4}-\d{2}-\d{2})?T?(?:(\d{2}):(\d{2})(?::(\d{2}(?:\.\d+)?))?)?Z?$/;

function isoSerial(text: string): number | null {
  const match = ISO.exec(text);
  if (match === null) return null;
  const day = match[1] === undefined ? null : parseDay(match[1]);
  if (match[1] !== undefined && day === null) return null;
  const seconds = Number(match[2] ?? 0) * 3600 + Number(match[3] ?? 0) * 60 + Number(match[4] ?? 0);
  return (day === null ? 0 : toSerial(day, 1900)) + seconds / 86_400;
}

function isSame(cell: Cell, [kind, value]: AgreedCell): boolean {
  switch (kind) {
    case 's':
      return cell.kind === 'text' && cell.raw === value;
    case 'b':
      return cell.kind === 'boolean' && (cell.raw === 'TRUE') === value;
    case 'e':
      return cell.kind === 'error' && cell.raw === value;
    case 'n':
      return cell.kind === 'number' && cell.number === value;
    default: {
      // Agreed serials are those of the file's own system; which it is, is compared apart.
      const serial = cell.kind === 'date' ? isoSerial(cell.raw) : (cell.number ?? Number.NaN);
      return serial !== null && Math.abs(serial - Number(value)) <= SAME_TIME;
    }
  }
}

const show = (cell: Cell | undefined): string =>
  cell === undefined
    ? 'nothing'
    : `${cell.kind} ${JSON.stringify(cell.raw)}${cell.dateFormat === true ? ' (date)' : ''}`;

function sheetDifferences(sheet: Sheet, agreed: AgreedWorkbook['sheets'][number]): string[] {
  // An empty text and a blank cell are the same to whoever reads on.
  const mine = new Map(sheet.rows.flatMap((row) => row.cells.map((cell) => [cell.address, cell] as const)));
  const theirs = Object.entries(agreed.cells ?? {}).filter(([, cell]) => cell[1] !== '');
  const known = new Set(theirs.map(([address]) => address));
  const wrong = theirs.flatMap(([address, cell]) => {
    const own = mine.get(address);
    return own !== undefined && isSame(own, cell)
      ? []
      : [`${sheet.name}!${address}: read ${show(own)}, agreed ${cell.join(' ')}`];
  });
  const more = [...mine.values()].flatMap((cell) =>
    cell.raw === '' || known.has(cell.address)
      ? []
      : [`${sheet.name}!${cell.address}: read ${show(cell)}, agreed nothing`],
  );
  return [...wrong, ...more];
}

/** Where a reading and the agreed contents differ, one line each; none when they are equal. */
export function differences(workbook: Workbook, agreed: AgreedWorkbook): string[] {
  const found: string[] = [];
  if (workbook.date1904 !== agreed.date1904) found.push(`1904 system: read ${String(workbook.date1904)}`);
  const sheets = new Map(workbook.sheets.map((sheet) => [sheet.name, sheet]));
  for (const theirs of agreed.sheets) {
    const sheet = sheets.get(theirs.name);
    sheets.delete(theirs.name);
    if (sheet === undefined) {
      found.push(`${theirs.name}: not read`);
      continue;
    }
    // Some of the agreeing readers know no sheet states.
    if (theirs.state !== undefined && sheet.hidden !== (theirs.state !== 'visible')) {
      found.push(`${theirs.name}: read as ${sheet.hidden ? 'hidden' : 'visible'}`);
    }
    found.push(...sheetDifferences(sheet, theirs));
  }
  const more = [...sheets.values()].filter((sheet) => sheet.kind === 'worksheet');
  return [...found, ...more.map(({ name }) => `${name}: read, agreed nothing`)];
}

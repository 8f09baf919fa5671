import { fromSerial } from '#shared/dates/excel-serial.ts';
import type { Cell } from './types.ts';

const two = (number: number): string => String(number).padStart(2, '0');

/** What stood in a cell as the person who wrote it saw it: dates as dates, numbers without the noise of their storing. */
export function rawText(cell: Cell, { date1904 }: { readonly date1904: boolean }): string {
  if (cell.kind !== 'number' || cell.number === undefined) return cell.raw;
  const parts = cell.dateFormat === true ? fromSerial(cell.number, date1904 ? 1904 : 1900) : null;
  if (parts === null) return String(cell.number);
  const seconds = parts.second === 0 ? '' : `:${two(parts.second)}`;
  const time = `${two(parts.hour)}:${two(parts.minute)}${seconds}`;
  if (parts.day === null) return time;
  return cell.timeFormat === true || !Number.isInteger(cell.number) ? `${parts.day} ${time}` : parts.day;
}

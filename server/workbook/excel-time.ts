import { parseDay } from '#shared/dates/calendar-day.ts';
import { toSerial } from '#shared/dates/excel-serial.ts';

export const TIME_FORMAT = 'yyyy-mm-dd hh:mm';
export const DAY_FORMAT = 'yyyy-mm-dd';

const WALL = /^(\d{4}-\d{2}-\d{2})(?:T(\d{2}):(\d{2}))?$/;

/** Serial (1900 system) of a wall-clock time `YYYY-MM-DDTHH:mm` or a day `YYYY-MM-DD`; null for any other text. */
export function serialOf(wall: string): number | null {
  const match = WALL.exec(wall);
  const day = parseDay(match?.[1] ?? '');
  if (match === null || day === null) return null;
  return toSerial(day, 1900) + (Number(match[2] ?? 0) * 60 + Number(match[3] ?? 0)) / 1440;
}

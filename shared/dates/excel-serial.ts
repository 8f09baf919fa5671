import { dayNumber, dayParts, formatDay, type DayParts } from './calendar-day.ts';

/** A serial as date and time of day, by arithmetic alone (ECMA-376, Date Representation). */
export type SerialParts = {
  /** `YYYY-MM-DD`; null for a time of day without a date (day 0 of the 1900 system). */
  readonly day: string | null;
  readonly hour: number;
  readonly minute: number;
  readonly second: number;
};

export type DateSystem = 1900 | 1904;

/** Last serials that a workbook can hold: 9999-12-31. */
const LAST = { 1900: 2_958_465, 1904: 2_957_003 } as const;

const BEFORE_1900 = dayNumber({ year: 1899, month: 12, day: 31 });
const FIRST_1904 = dayNumber({ year: 1904, month: 1, day: 1 });
/** Serial of the 1900-02-29 that never was; later serials of that system run one ahead. */
const PHANTOM = 60;

function dayOf(days: number, system: DateSystem): string | null {
  if (system === 1904) return formatDay(dayParts(FIRST_1904 + days));
  if (days === 0) return null;
  return formatDay(dayParts(BEFORE_1900 + (days > PHANTOM ? days - 1 : days)));
}

/** Serial number of a cell to date and time, rounded to the second. Null: negative, beyond 9999, serial 60 of the 1900 system (no such day), or not a number. */
export function fromSerial(serial: number, system: DateSystem): SerialParts | null {
  if (!Number.isFinite(serial) || serial < 0) return null;
  const total = Math.round(serial * 86_400);
  const days = Math.floor(total / 86_400);
  if (days > LAST[system] || (system === 1900 && days === PHANTOM)) return null;
  const seconds = total - days * 86_400;
  return {
    day: dayOf(days, system),
    hour: Math.floor(seconds / 3600),
    minute: Math.floor(seconds / 60) % 60,
    second: seconds % 60,
  };
}

/** Wall clock `YYYY-MM-DDTHH:mm` of a serial, rounded to the minute; null where there is no such date, or only a time of day. */
export function serialToWallClock(serial: number, system: DateSystem): string | null {
  const minutes = Math.round(serial * 1440);
  const parts = minutes < 1440 ? null : fromSerial(minutes / 1440, system);
  if (parts === null || parts.day === null) return null;
  const two = (value: number) => String(value).padStart(2, '0');
  return `${parts.day}T${two(parts.hour)}:${two(parts.minute)}`;
}

/** Serial of a day that exists (see `parseDay`), the reverse of `fromSerial`. */
export function toSerial(day: DayParts, system: DateSystem): number {
  const number = dayNumber(day);
  if (system === 1904) return number - FIRST_1904;
  const days = number - BEFORE_1900;
  return days >= PHANTOM ? days + 1 : days;
}

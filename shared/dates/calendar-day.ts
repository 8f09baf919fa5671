/** Calendar days as `YYYY-MM-DD` strings and as day numbers (days since 1970-01-01). A day is never an instant. */
export type DayParts = { readonly year: number; readonly month: number; readonly day: number };

const DAY = /^(\d{4})-(\d{2})-(\d{2})$/;

const leap = (year: number) => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

/** Days of a month, proleptic Gregorian; `month` 1 to 12. */
export function daysInMonth(year: number, month: number): number {
  if (month === 2) return leap(year) ? 29 : 28;
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
}

/** Days since 1970-01-01 of a proleptic Gregorian date, counting in years that begin in March. */
export function dayNumber({ year, month, day }: DayParts): number {
  const y = month <= 2 ? year - 1 : year;
  const era = Math.floor(y / 400);
  const yearOfEra = y - era * 400;
  const dayOfYear = Math.floor((153 * (month + (month > 2 ? -3 : 9)) + 2) / 5) + day - 1;
  const dayOfEra = yearOfEra * 365 + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear;
  return era * 146_097 + dayOfEra - 719_468;
}

/** The reverse of `dayNumber`. */
export function dayParts(number: number): DayParts {
  const shifted = number + 719_468;
  const era = Math.floor(shifted / 146_097);
  const dayOfEra = shifted - era * 146_097;
  const yearOfEra = Math.floor(
    (dayOfEra -
      Math.floor(dayOfEra / 1460) +
      Math.floor(dayOfEra / 36_524) -
      Math.floor(dayOfEra / 146_096)) /
      365,
  );
  const dayOfYear = dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100));
  const shiftedMonth = Math.floor((5 * dayOfYear + 2) / 153);
  const month = shiftedMonth < 10 ? shiftedMonth + 3 : shiftedMonth - 9;
  const year = yearOfEra + era * 400 + (month <= 2 ? 1 : 0);
  return { year, month, day: dayOfYear - Math.floor((153 * shiftedMonth + 2) / 5) + 1 };
}

/** Parts of a `YYYY-MM-DD` day that exists; null otherwise. */
export function parseDay(text: string): DayParts | null {
  const match = DAY.exec(text);
  if (match === null) return null;
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  if (month < 1 || month > 12 || day < 1 || day > daysInMonth(year, month)) return null;
  return { year, month, day };
}

const pad = (value: number, width: number) => String(value).padStart(width, '0');

export function formatDay({ year, month, day }: DayParts): string {
  return `${pad(year, 4)}-${pad(month, 2)}-${pad(day, 2)}`;
}

/** A day so many days later (earlier if negative); null if `day` is none. */
export function addDays(day: string, days: number): string | null {
  const parts = parseDay(day);
  return parts === null ? null : formatDay(dayParts(dayNumber(parts) + days));
}

/** Days from one to the other; null if either is none. */
export function daysBetween(from: string, to: string): number | null {
  const a = parseDay(from);
  const b = parseDay(to);
  return a === null || b === null ? null : dayNumber(b) - dayNumber(a);
}

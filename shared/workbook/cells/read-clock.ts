import { addDays, parseDay } from '#shared/dates/calendar-day.ts';
import { fromSerial } from '#shared/dates/excel-serial.ts';
import type { Cell } from '#shared/workbook/types.ts';
import { cleanMeasure } from './clean-text.ts';
import { type Reading, unreadable, value } from './reading.ts';

/** Serials of 2000-01-01 and 2100-01-01 (1900 system): outside them a bare number in a clock column is more likely something else. */
const FROM_SERIAL = 36_526;
const TO_SERIAL = 73_051;
const DAYS_TO_1904 = 1462;

const ISO_DAY = /^(\d{4})-(\d{1,2})-(\d{1,2})/;
const US_DAY = /^(\d{1,2})\/(\d{1,2})\/(\d{4})/;
const TIME = /^(\d{1,2}):(\d{2})(?::(\d{2})(?:\.\d+)?)?(?: ?([ap])\.?m\.?)?$/;

type When = { readonly day: string | null; readonly time: string | null };

const two = (number: number): string => String(number).padStart(2, '0');

function serialWhen(cell: Cell, date1904: boolean): When | null {
  const serial = cell.number ?? Number.NaN;
  const in1900 = date1904 ? serial + DAYS_TO_1904 : serial;
  if (cell.dateFormat !== true && (in1900 < FROM_SERIAL || in1900 >= TO_SERIAL)) return null;
  const parts = fromSerial(serial, date1904 ? 1904 : 1900);
  if (parts === null) return null;
  // A whole serial in a format without hours is a day; with hours it is midnight.
  const dayOnly = Number.isInteger(serial) && cell.timeFormat !== true;
  return { day: parts.day, time: dayOnly ? null : `${two(parts.hour)}:${two(parts.minute)}` };
}

function timeOf(text: string): string | null {
  const match = TIME.exec(text);
  if (!match) return null;
  const [, hourText, minute = '', second = '0', half] = match;
  let hour = Number(hourText);
  if (half !== undefined) {
    if (hour < 1 || hour > 12) return null;
    hour = (hour % 12) + (half === 'p' ? 12 : 0);
  }
  return hour > 23 || Number(minute) > 59 || Number(second) > 59 ? null : `${two(hour)}:${minute}`;
}

/** Day and time of a text in the guide's forms; 'no-such-day' for a date that the calendar lacks. */
function textWhen(text: string): When | null | 'no-such-day' {
  const iso = ISO_DAY.exec(text);
  const us = US_DAY.exec(text);
  const found = iso ?? us;
  if (!found) {
    const time = timeOf(text);
    return time === null ? null : { day: null, time };
  }
  const [year, month, date] = iso ? [found[1], found[2], found[3]] : [found[3], found[1], found[2]];
  const day = `${year}-${two(Number(month))}-${two(Number(date))}`;
  const rest = text.slice(found[0].length);
  if (rest !== '' && !/^[ t]/.test(rest)) return null;
  const time = rest === '' ? null : timeOf(rest.slice(1).trim());
  if (rest !== '' && time === null) return null;
  return parseDay(day) === null ? 'no-such-day' : { day, time };
}

/** A serial of 11:00 that went through floating point is written 10:59:59.99…: within half a second of a minute it is that minute. */
const JUST_BEFORE = /:59\.[5-9]\d*z?$/;

function nextMinute({ day, time }: When): When {
  const minutes = time === null ? 0 : Number(time.slice(0, 2)) * 60 + Number(time.slice(3)) + 1;
  if (minutes === 1440) return { day: day === null ? null : addDays(day, 1), time: '00:00' };
  return { day, time: time === null ? null : `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}` };
}

function whenOf(cell: Cell, date1904: boolean): When | null | 'no-such-day' {
  if (cell.kind === 'number') return serialWhen(cell, date1904);
  const text = cleanMeasure(cell.raw);
  // Only ISO date cells of the file format may end in Z; there it says nothing about a zone.
  if (cell.kind !== 'date') return textWhen(text);
  const when = textWhen(text.replace(/z$/, ''));
  return when !== null && when !== 'no-such-day' && JUST_BEFORE.test(text) ? nextMinute(when) : when;
}

/** A wall-clock time `YYYY-MM-DDTHH:mm` (seconds dropped) from a real date-time, or from text in the guide's forms. */
export function readClock(cell: Cell, date1904: boolean): Reading {
  const when = whenOf(cell, date1904);
  if (when === null) return unreadable('clock');
  if (when === 'no-such-day') return unreadable('no-such-day');
  if (when.day === null) return unreadable('time-only');
  return when.time === null ? unreadable('day-only') : value(`${when.day}T${when.time}`);
}

/** A calendar day `YYYY-MM-DD`; a time beside it is left out. */
export function readDay(cell: Cell, date1904: boolean): Reading {
  const when = whenOf(cell, date1904);
  if (when === null) return unreadable('day');
  if (when === 'no-such-day') return unreadable('no-such-day');
  return when.day === null ? unreadable('time-only') : value(when.day);
}

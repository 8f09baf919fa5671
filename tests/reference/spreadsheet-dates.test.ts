import { expect, test } from 'vitest';
import { fromSerial, toSerial } from '#shared/dates/excel-serial.ts';
import { parseDay } from '#shared/dates/calendar-day.ts';

// Source: ECMA-376 Office Open XML, part 4, SpreadsheetML, Date Representation. Status: read.
test.each([
  [1900, '1900-01-01', 1],
  [1900, '1900-02-28', 59],
  [1900, '1900-03-01', 61],
  [1900, '9999-12-31', 2_958_465],
  [1904, '2006-02-01', 37_287],
  [1904, '9999-12-31', 2_957_003],
  // Status of the rest: derived; the systems differ by 1462.
  [1900, '2020-01-01', 43_831],
  [1904, '2020-01-01', 42_369],
  [1900, '2024-02-29', 45_351],
  [1904, '2024-02-29', 43_889],
  [1900, '2026-11-01', 46_327],
  [1904, '2026-11-01', 44_865],
  [1900, '1999-12-31', 36_525],
  [1904, '1999-12-31', 35_063],
] as const)('%i system, %s is %i', (system, day, serial) => {
  expect(fromSerial(serial, system)?.day).toBe(day);
  const parts = parseDay(day);
  expect(parts === null ? null : toSerial(parts, system)).toBe(serial);
});

// Source: the same: serial 60 is 1900-02-29, a day that never was. Status: read.
test('serial 60 of the 1900 system is no day', () => {
  expect(fromSerial(60, 1900)).toBeNull();
  expect(fromSerial(60.5, 1900)).toBeNull();
});

test.each([2_958_466, -1, Number.NaN, Number.POSITIVE_INFINITY])('%d is no date', (serial) => {
  expect(fromSerial(serial, 1900)).toBeNull();
});

// Source: time of day as a fraction of a day. Status: derived.
test.each([
  [46_327.75, '2026-11-01', 18, 0, 0],
  [46_327.271006944444, '2026-11-01', 6, 30, 15],
  [46_327.9999999, '2026-11-02', 0, 0, 0],
])('%d', (serial, day, hour, minute, second) => {
  expect(fromSerial(serial, 1900)).toEqual({ day, hour, minute, second });
});

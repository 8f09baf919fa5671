import fc from 'fast-check';
import { expect, test } from 'vitest';
import { addDays, dayNumber, dayParts, daysBetween, formatDay, parseDay } from './calendar-day.ts';

test('day numbers and dates are each other’s reverse', () => {
  fc.assert(
    fc.property(fc.integer({ min: -700_000, max: 2_900_000 }), (number) => {
      const parts = dayParts(number);
      expect(dayNumber(parts)).toBe(number);
      expect(parts.year < 0 || parts.year > 9999 || parseDay(formatDay(parts))).toEqual(
        parts.year < 0 || parts.year > 9999 ? true : parts,
      );
    }),
  );
});

// 1970-01-01 is day 0 by definition; 2000-03-01 is day 11017 of the common calendar.
test('known days', () => {
  expect(dayNumber({ year: 1970, month: 1, day: 1 })).toBe(0);
  expect(dayNumber({ year: 2000, month: 3, day: 1 })).toBe(11_017);
  expect(addDays('2024-02-28', 2)).toBe('2024-03-01');
  expect(addDays('2026-01-01', -1)).toBe('2025-12-31');
  expect(daysBetween('2026-03-01', '2026-11-01')).toBe(245);
});

test.each([
  '2026-02-29',
  '1900-02-29',
  '2026-13-01',
  '2026-00-10',
  '2026-04-31',
  '2026-4-1',
  ' 2026-04-01',
  '',
])('%s is no day', (text) => {
  expect(parseDay(text)).toBeNull();
  expect(addDays(text, 1)).toBeNull();
  expect(daysBetween(text, '2026-01-01')).toBeNull();
});

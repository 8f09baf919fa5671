import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parseDay } from './calendar-day.ts';
import { fromSerial, serialToWallClock, toSerial } from './excel-serial.ts';

test.each([1900, 1904] as const)('serial to day and back, %i system', (system) => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 2_900_000 }), (serial) => {
      fc.pre(system === 1904 || serial !== 60);
      const day = parseDay(fromSerial(serial, system)?.day ?? '');
      expect(day === null ? null : toSerial(day, system)).toBe(serial);
    }),
  );
});

// 46126 is 2026-04-14: 46327 (2026-11-01) less 201 days.
test.each([
  [46_126 + 10 / 24 + 24 / 1440, '2026-04-14T10:24'],
  [46_126.43333333333, '2026-04-14T10:24'],
  [46_126 + 0.999_99, '2026-04-15T00:00'],
  [46_126, '2026-04-14T00:00'],
])('%d is %s', (serial, wall) => {
  expect(serialToWallClock(serial, 1900)).toBe(wall);
  expect(serialToWallClock(serial - 1462, 1904)).toBe(wall);
});

test('a time of day alone is no moment', () => {
  expect(serialToWallClock(0.4, 1900)).toBeNull();
  expect(serialToWallClock(0.4, 1904)).toBeNull();
  expect(fromSerial(0.5, 1900)).toEqual({ day: null, hour: 12, minute: 0, second: 0 });
  expect(fromSerial(0, 1904)?.day).toBe('1904-01-01');
  expect(serialToWallClock(Number.NaN, 1900)).toBeNull();
});

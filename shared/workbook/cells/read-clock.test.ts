import { describe, expect, it } from 'vitest';
import type { Cell } from '#shared/workbook/types.ts';
import { field, numberCell, textCell, SYSTEM, short, read } from './cells-for-tests.ts';
import { readCell } from './read-cell.ts';

describe('times', () => {
  const CLOCK = field('clock');
  const DAY = field('day');
  it.each([
    ['2026-04-14 10:24', '2026-04-14T10:24'],
    ['2026-04-14 9:05', '2026-04-14T09:05'],
    ['2026-04-14T09:05', '2026-04-14T09:05'],
    ['2026-04-14 10:24:59', '2026-04-14T10:24'],
    ['4/14/2026 10:24 AM', '2026-04-14T10:24'],
    ['4/14/2026 10:24 pm', '2026-04-14T22:24'],
    ['4/14/2026 12:05 AM', '2026-04-14T00:05'],
    ['4/14/2026 12:05 p.m.', '2026-04-14T12:05'],
    ['04/14/2026 16:05', '2026-04-14T16:05'],
    ['4/14/2026  10:24 AM', '2026-04-14T10:24'],
    ['2026-02-30 10:24', 'no-such-day'],
    ['14/4/2026 10:24', 'no-such-day'],
    ['2026-04-14', 'day-only'],
    ['10:24', 'time-only'],
    ['2026-04-14 25:00', 'clock'],
    ['2026-04-14 24:00', 'clock'],
    ['2026-04-14 10:60', 'clock'],
    ['4/14/2026 13:24 PM', 'clock'],
    ['4/14/26 10:24', 'clock'],
    ['14.04.2026 10:24', 'clock'],
    ['2026-04-14 10:24Z', 'clock'],
    ['April 14', 'clock'],
    ['yesterday', 'clock'],
  ])('%s', (raw, expected) => {
    expect(read(raw, CLOCK)).toBe(expected);
  });

  // Serials: 2026-04-14 is 46126 in the 1900 system and 44664 (1462 less) in the 1904 system; 10:24 is 624 of 1440 minutes.
  it('takes real date-times of both systems', () => {
    const time = { dateFormat: true, timeFormat: true };
    expect(short(readCell(numberCell(46_126 + 624 / 1440, time), CLOCK, SYSTEM))).toBe('2026-04-14T10:24');
    expect(short(readCell(numberCell(44_664 + 624 / 1440, time), CLOCK, { date1904: true }))).toBe(
      '2026-04-14T10:24',
    );
    expect(short(readCell(numberCell(46_126, time), CLOCK, SYSTEM))).toBe('2026-04-14T00:00');
    expect(short(readCell(numberCell(46_126, { dateFormat: true }), CLOCK, SYSTEM))).toBe('day-only');
    expect(short(readCell(numberCell(624 / 1440, time), CLOCK, SYSTEM))).toBe('time-only');
    expect(short(readCell(numberCell(46_126.5), CLOCK, SYSTEM))).toBe('2026-04-14T12:00');
  });

  it('takes no other number for a time', () => {
    for (const number of [1024, 10.24, 20_260_414, 4_142_026, -5]) {
      expect(short(readCell(numberCell(number), CLOCK, SYSTEM))).toBe('clock');
    }
  });

  it('takes ISO date cells', () => {
    const cell: Cell = { ...textCell('2026-04-14T10:24:00.000Z'), kind: 'date' };
    expect(short(readCell(cell, CLOCK, SYSTEM))).toBe('2026-04-14T10:24');
    expect(short(readCell(cell, DAY, SYSTEM))).toBe('2026-04-14');
  });

  it('takes an ISO time a hair before a minute for that minute, as it takes a serial', () => {
    const iso = (raw: string) => short(readCell({ ...textCell(raw), kind: 'date' }, CLOCK, SYSTEM));
    expect(iso('2026-04-14T10:59:59.9999999999984025')).toBe('2026-04-14T11:00');
    expect(iso('2026-12-31T23:59:59.9999999Z')).toBe('2027-01-01T00:00');
    expect(iso('2026-04-14T10:59:59.4')).toBe('2026-04-14T10:59');
    expect(iso('2026-04-14T10:59:58.9')).toBe('2026-04-14T10:59');
  });

  it('takes days with or without a time', () => {
    expect(read('4/1/2026', DAY)).toBe('2026-04-01');
    expect(read('2026-04-01 10:00', DAY)).toBe('2026-04-01');
    expect(short(readCell(numberCell(46_126, { dateFormat: true }), DAY, SYSTEM))).toBe('2026-04-14');
    expect(read('2026-13-01', DAY)).toBe('no-such-day');
    expect(read('10:00', DAY)).toBe('time-only');
  });
});

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { isZone, toInstant, toWallClock } from './wall-clock.ts';

const ZONES = [
  'America/Chicago',
  'America/St_Johns',
  'Pacific/Chatham',
  'Asia/Kathmandu',
  'Australia/Lord_Howe',
  'UTC',
];

test('an instant’s wall clock leads back to it, or happened twice', () => {
  const minutes = fc.integer({ min: Date.UTC(1995, 0) / 60_000, max: Date.UTC(2040, 0) / 60_000 });
  fc.assert(
    fc.property(minutes, fc.constantFrom(...ZONES), (minute, zone) => {
      const ms = minute * 60_000;
      const back = toInstant(toWallClock(ms, zone) ?? '', zone);
      expect(back).toEqual('problem' in back ? { problem: 'overlap' } : { ms });
    }),
  );
});

// Lord Howe Island changes by half an hour, at 02:00, on the first Sundays of October and April (IANA Time Zone Database).
test('a half-hour change', () => {
  expect(toInstant('2026-10-04T02:15', 'Australia/Lord_Howe')).toEqual({ problem: 'gap' });
  expect(toInstant('2026-10-04T02:30', 'Australia/Lord_Howe')).toHaveProperty('ms');
  expect(toInstant('2026-04-05T01:45', 'Australia/Lord_Howe')).toEqual({ problem: 'overlap' });
});

// Samoa left out 2011-12-30 whole (IANA Time Zone Database).
test('a day that was left out', () => {
  expect(toInstant('2011-12-30T12:00', 'Pacific/Apia')).toEqual({ problem: 'gap' });
});

test.each([
  '2026-02-29T10:00',
  '2026-04-31T10:00',
  '2026-04-14T24:00',
  '2026-04-14',
  '2026-4-14T10:00',
  'not-yet',
  '',
])('%s is no time', (wall) => {
  expect(toInstant(wall, 'UTC')).toEqual({ problem: 'unreal' });
});

test('an unknown zone is said, not guessed', () => {
  expect(toInstant('2026-04-14T10:00', 'America/Nowhere')).toEqual({ problem: 'zone' });
  expect(toWallClock(0, 'America/Nowhere')).toBeNull();
  expect(toWallClock(Number.NaN, 'UTC')).toBeNull();
  expect([isZone('America/Chicago'), isZone('')]).toEqual([true, false]);
});

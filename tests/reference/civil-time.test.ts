import { expect, test } from 'vitest';
import { toInstant, toWallClock } from '#shared/dates/wall-clock.ts';

// Source: IANA Time Zone Database, northamerica: rule US 2007-max (second Sunday of March, first of November, 02:00 local),
// zones America/Chicago, Denver and Phoenix. Status: instants derived from the rule by exact arithmetic.
const at = (utc: string) => ({ ms: Date.parse(utc) });

test.each([
  ['America/Chicago', '2024-03-10', '2024-03-10T08:00:00Z'],
  ['America/Denver', '2024-03-10', '2024-03-10T09:00:00Z'],
  ['America/Denver', '2025-03-09', '2025-03-09T09:00:00Z'],
  ['America/Chicago', '2026-03-08', '2026-03-08T08:00:00Z'],
])('%s, spring of %s: the hour from 02:00 does not exist', (zone, day, utc) => {
  expect(toInstant(`${day}T01:59`, zone)).toEqual({ ms: Date.parse(utc) - 60_000 });
  expect(toInstant(`${day}T02:00`, zone)).toEqual({ problem: 'gap' });
  expect(toInstant(`${day}T02:59`, zone)).toEqual({ problem: 'gap' });
  expect(toInstant(`${day}T03:00`, zone)).toEqual(at(utc));
});

test.each([
  ['America/Chicago', '2024-11-03', '2024-11-03T07:00:00Z'],
  ['America/Chicago', '2025-11-02', '2025-11-02T07:00:00Z'],
  ['America/Denver', '2025-11-02', '2025-11-02T08:00:00Z'],
  ['America/Denver', '2026-11-01', '2026-11-01T08:00:00Z'],
])('%s, autumn of %s: the hour from 01:00 exists twice', (zone, day, utc) => {
  expect(toInstant(`${day}T00:59`, zone)).toEqual({ ms: Date.parse(utc) - 61 * 60_000 });
  expect(toInstant(`${day}T01:00`, zone)).toEqual({ problem: 'overlap' });
  expect(toInstant(`${day}T01:59`, zone)).toEqual({ problem: 'overlap' });
  expect(toInstant(`${day}T02:00`, zone)).toEqual({ ms: Date.parse(utc) + 60 * 60_000 });
});

test('both instants of a repeated time show the same wall clock', () => {
  expect(toWallClock(Date.parse('2026-11-01T06:30:00Z'), 'America/Chicago')).toBe('2026-11-01T01:30');
  expect(toWallClock(Date.parse('2026-11-01T07:30:00Z'), 'America/Chicago')).toBe('2026-11-01T01:30');
});

test.each(['2024-03-10', '2025-03-09', '2026-03-08', '2024-11-03', '2025-11-02', '2026-11-01'])(
  'America/Phoenix changes nothing on %s',
  (day) => {
    expect(toInstant(`${day}T02:30`, 'America/Phoenix')).toEqual(at(`${day}T09:30:00Z`));
    expect(toInstant(`${day}T01:30`, 'America/Phoenix')).toEqual(at(`${day}T08:30:00Z`));
  },
);

test('an hour passes between 01:30 and 03:30 on the night of the spring change', () => {
  const from = toInstant('2026-03-08T01:30', 'America/Denver');
  const to = toInstant('2026-03-08T03:30', 'America/Denver');
  expect('ms' in from && 'ms' in to ? (to.ms - from.ms) / 60_000 : null).toBe(60);
});

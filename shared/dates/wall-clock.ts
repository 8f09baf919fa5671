import { dayNumber, formatDay, dayParts, parseDay } from './calendar-day.ts';

/**
 * Why a wall-clock time names no one instant: the clocks were set forward over it (`gap`) or back (`overlap`), it is no
 * time at all (`unreal`, as 02-30), or the zone is unknown (`zone`).
 */
export type ClockProblem = 'gap' | 'overlap' | 'unreal' | 'zone';
export type ClockResult = { readonly ms: number } | { readonly problem: ClockProblem };

const MINUTE = 60_000;
const DAY = 86_400_000;
const WALL = /^(\d{4}-\d{2}-\d{2})T([01]\d|2[0-3]):([0-5]\d)(?::([0-5]\d))?$/;

/** Building a formatter is slow, and a batch asks for one zone thousands of times. */
const formatters = new Map<string, Intl.DateTimeFormat | null>();

function formatter(zone: string): Intl.DateTimeFormat | null {
  const held = formatters.get(zone);
  if (held !== undefined) return held;
  let made: Intl.DateTimeFormat | null;
  try {
    made = new Intl.DateTimeFormat('en-US', {
      timeZone: zone,
      calendar: 'gregory',
      numberingSystem: 'latn',
      hourCycle: 'h23',
      era: 'short',
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: 'numeric',
      minute: 'numeric',
      second: 'numeric',
    });
  } catch {
    made = null;
  }
  formatters.set(zone, made);
  return made;
}

/** Is this an IANA zone known here? */
export function isZone(zone: string): boolean {
  return formatter(zone) !== null;
}

/** What a wall clock shows at an instant, as if it were UTC milliseconds. */
function wallMs(format: Intl.DateTimeFormat, ms: number): number {
  const part: Record<string, string> = {};
  for (const { type, value } of format.formatToParts(ms)) part[type] = value;
  const year = part['era'] === 'BC' ? 1 - Number(part['year']) : Number(part['year']);
  const days = dayNumber({ year, month: Number(part['month']), day: Number(part['day']) });
  const seconds = Number(part['hour']) * 3600 + Number(part['minute']) * 60 + Number(part['second']);
  return days * DAY + seconds * 1000;
}

/** Offsets at midnights (UTC) by zone: a batch asks for the same few days thousands of times. */
const offsets = new WeakMap<Intl.DateTimeFormat, Map<number, number>>();

/** Some thirty years of days; a workbook of more is absurd, and may not fill the memory. */
const KEPT_OFFSETS = 10_000;

/** What a zone's clocks are ahead of UTC at an instant, in milliseconds. */
function offsetAt(format: Intl.DateTimeFormat, ms: number): number {
  let known = offsets.get(format);
  if (known === undefined) {
    known = new Map();
    offsets.set(format, known);
  }
  const held = known.get(ms);
  if (held !== undefined) return held;
  const offset = wallMs(format, ms) - ms;
  if (known.size >= KEPT_OFFSETS) known.clear();
  known.set(ms, offset);
  return offset;
}

/** `YYYY-MM-DDTHH:mm[:ss]` as if it were UTC milliseconds; null if it is no time. */
function parseWall(wall: string): number | null {
  const match = WALL.exec(wall);
  const day = match === null ? null : parseDay(match[1] ?? '');
  if (match === null || day === null) return null;
  const seconds = Number(match[2]) * 3600 + Number(match[3]) * 60 + Number(match[4] ?? 0);
  return dayNumber(day) * DAY + seconds * 1000;
}

/** The instant (UTC milliseconds) at which a wall clock in the zone shows this time, or why there is no one such instant. */
export function toInstant(wall: string, zone: string): ClockResult {
  const shown = parseWall(wall);
  if (shown === null) return { problem: 'unreal' };
  const format = formatter(zone);
  if (format === null) return { problem: 'zone' };
  // No zone changes its clock twice within four days: with one offset at both ends there is no change between.
  const midnight = Math.floor(shown / DAY) * DAY;
  const [before, after] = [offsetAt(format, midnight - DAY), offsetAt(format, midnight + 2 * DAY)];
  if (before === after) return { ms: shown - before };
  // Else these are the only offsets that can hold at this wall time.
  const found = new Set<number>();
  for (const offset of [before, after])
    if (wallMs(format, shown - offset) === shown) found.add(shown - offset);
  const [ms] = found;
  if (ms === undefined) return { problem: 'gap' };
  return found.size > 1 ? { problem: 'overlap' } : { ms };
}

/** The wall-clock time `YYYY-MM-DDTHH:mm` in the zone at an instant, seconds dropped; null for an unknown zone or no number. */
export function toWallClock(ms: number, zone: string): string | null {
  const format = formatter(zone);
  if (format === null || !Number.isFinite(ms) || Math.abs(ms) > 8.64e15) return null;
  const shown = wallMs(format, ms);
  const days = Math.floor(shown / DAY);
  const minutes = Math.floor((shown - days * DAY) / MINUTE);
  const two = (value: number) => String(value).padStart(2, '0');
  return `${formatDay(dayParts(days))}T${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
}

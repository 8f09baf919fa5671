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
  // The offsets a day before and after are the only ones that can hold at this wall time.
  const found = new Set<number>();
  for (const near of [shown - DAY, shown + DAY]) {
    const candidate = shown - (wallMs(format, near) - near);
    if (wallMs(format, candidate) === shown) found.add(candidate);
  }
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

import { formatDay } from './format-day.ts';

/** `2026-04-14T10:42` -> `14 Apr 2026, 10:42`, without any zone: a wall clock is shown as it was read. */
export function formatWallClock(wall: string): string {
  const match = /^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2})/.exec(wall);
  return match?.[1] && match[2] ? `${formatDay(match[1])}, ${match[2]}` : wall;
}

/** An instant as day and time in `zone` (IANA), else in the reader's own. */
export function formatInstant(at: string, zone?: string): string {
  const date = new Date(at);
  if (Number.isNaN(date.getTime())) return at;
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(date);
  const part = (type: string) => parts.find((one) => one.type === type)?.value ?? '';
  return formatWallClock(`${part('year')}-${part('month')}-${part('day')}T${part('hour')}:${part('minute')}`);
}

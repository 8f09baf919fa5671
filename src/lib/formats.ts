export { formatDay } from '#shared/dates/format-day.ts';
export { formatInstant, formatWallClock } from '#shared/dates/format-moment.ts';

/** `1,234`. */
export function formatCount(count: number): string {
  return count.toLocaleString('en-US');
}

/** `1 line`, `3 lines`. */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${formatCount(count)} ${count === 1 ? one : many}`;
}

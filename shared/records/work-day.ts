import type { FieldValues, Kind } from './types.ts';

/** The time whose day is the line's work day: the day set, pulled or raised. */
export const WORK_TIME: Readonly<Record<Kind, string>> = {
  set: 'setAt',
  straighten: 'pulledAt',
  relevel: 'raisedAt',
};

const WALL_CLOCK = /^(\d{4}-\d{2}-\d{2})T\d{2}:\d{2}/;

/** Calendar day (`YYYY-MM-DD`, wall clock of the work order) that decides which standard a line is checked on; null when the time is not known. */
export const workDay = (kind: Kind, values: FieldValues): string | null => {
  const at = values[WORK_TIME[kind]];
  return typeof at === 'string' ? (WALL_CLOCK.exec(at)?.[1] ?? null) : null;
};

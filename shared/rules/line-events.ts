import type { FieldValues, SourceRow } from '#shared/records/types.ts';
import type { LineView, Pour } from './types.ts';

/** Rows that were mixed and poured at one time: one pour number of one event. */
export type PourGroup = {
  readonly pourNumber: number | null;
  readonly rows: readonly Pour[];
  /** UTC milliseconds; the latest of the rows, null when any row's time is missing or unreal. */
  readonly atMs: number | null;
};

/** One event of a line with its own pours and times: 1 as first built, 2 … rework or repair. */
export type EventView = {
  readonly event: number;
  /** Row that carries the event's times; null when the Events sheet has no row for it. */
  readonly source: SourceRow | null;
  readonly values: FieldValues;
  readonly broken: ReadonlySet<string>;
  readonly instants: ReadonlyMap<string, number>;
  /** In the order of their numbers. */
  readonly pours: readonly PourGroup[];
};

const EMPTY: ReadonlySet<string> = new Set();
const NO_INSTANTS: ReadonlyMap<string, number> = new Map();

const bucket = <K, T>(items: readonly T[], keyOf: (item: T) => K): Map<K, T[]> => {
  const buckets = new Map<K, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    const bucket = buckets.get(key);
    if (bucket) bucket.push(item);
    else buckets.set(key, [item]);
  }
  return buckets;
};

const latest = (rows: readonly Pour[]): number | null => {
  let at = -Infinity;
  for (const row of rows) {
    if (row.pouredAtMs === null) return null;
    at = Math.max(at, row.pouredAtMs);
  }
  return Number.isFinite(at) ? at : null;
};

const groupPours = (pours: readonly Pour[]): PourGroup[] =>
  [...bucket(pours, (pour) => pour.pourNumber)]
    .toSorted(([a], [b]) => (a ?? Number.MAX_VALUE) - (b ?? Number.MAX_VALUE))
    .map(([pourNumber, rows]) => ({ pourNumber, rows, atMs: latest(rows) }));

const made = new WeakMap<LineView, readonly EventView[]>();

/**
 * The line's events in order; made once for a line, since a dozen rules ask. Clock rules run event by event, so that a
 * later top-up does not put the first hardware in the wrong.
 */
export const lineEvents = (line: LineView): readonly EventView[] => {
  const before = made.get(line);
  if (before) return before;
  const events = eventsOf(line);
  made.set(line, events);
  return events;
};

const eventsOf = (line: LineView): readonly EventView[] => {
  // A pour whose event cannot be read belongs to no clock.
  const dated = line.pours.filter((pour) => !pour.broken.has('event'));
  const pours = bucket(dated, (pour) => pour.event);
  const rows = new Map(line.events.map((row) => [row.event, row]));
  const numbers = new Set([1, ...pours.keys(), ...rows.keys()]);
  return [...numbers]
    .toSorted((a, b) => a - b)
    .map((event) => {
      const row = event === 1 ? line : rows.get(event);
      return {
        event,
        source: row?.source ?? null,
        values: row?.values ?? {},
        broken: row?.broken ?? EMPTY,
        instants: row?.instants ?? NO_INSTANTS,
        pours: groupPours(pours.get(event) ?? []),
      };
    });
};

/** The pour of the event that foamed last; null when none, or when a time that could be later is not known. */
export const lastPour = (event: EventView): PourGroup | null => {
  if (event.pours.some((pour) => pour.atMs === null)) return null;
  return event.pours.reduce<PourGroup | null>(
    (last, pour) => (last === null || (pour.atMs ?? 0) >= (last.atMs ?? 0) ? pour : last),
    null,
  );
};

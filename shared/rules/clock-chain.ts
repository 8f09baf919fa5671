import type { Kind, SourceRow } from '#shared/records/types.ts';
import type { EventView } from './line-events.ts';
import type { LineView } from './types.ts';

/** A moment of an event that is known. */
export type Moment = {
  readonly field: string;
  readonly title: string;
  readonly source: SourceRow;
  /** Wall clock as recorded. */
  readonly wall: string;
  readonly atMs: number;
};

const POURS = 'pouredAt';

/** What each kind's times are called in a sentence, in the order they must have. */
const FIRST: Readonly<Record<Kind, readonly (readonly [string, string])[]>> = {
  set: [
    ['boredAt', 'boring'],
    ['setAt', 'setting'],
    [POURS, ''],
    ['letGoAt', 'letting go'],
    ['hardwareAt', 'first work'],
    ['loadAt', 'line tension'],
  ],
  straighten: [
    ['pulledAt', 'pulling'],
    [POURS, ''],
    ['releasedAt', 'release'],
    ['reattachedAt', 'reattachment'],
  ],
  relevel: [
    ['raisedAt', 'raising'],
    [POURS, ''],
    ['loweredAt', 'lowering'],
    ['releasedAt', 'release'],
  ],
};

const LATER: Readonly<Record<Kind, readonly (readonly [string, string])[]>> = {
  set: [['beganAt', 'the beginning of the work'], ...FIRST.set.slice(2)],
  straighten: [
    ['beganAt', 'the beginning of the work'],
    [POURS, ''],
    ['releasedAt', 'release'],
    ['hardwareAt', 'reattachment'],
  ],
  relevel: [['beganAt', 'the beginning of the work'], ...FIRST.relevel.slice(1)],
};

const stagesOf = (kind: Kind, event: number): readonly (readonly [string, string])[] =>
  event === 1 ? FIRST[kind] : LATER[kind];

/** Clock fields of a line's row, or of an event's row from 2 on; pours apart. */
export const clockFields = (kind: Kind, event: number): readonly string[] =>
  stagesOf(kind, event).flatMap(([field]) => (field === POURS ? [] : [field]));

/** The moments of one event that are known, in the order that they must have had. */
export const clockChain = (line: LineView, event: EventView): readonly Moment[] =>
  stagesOf(line.kind, event.event).flatMap(([field, title]): Moment[] => {
    if (field !== POURS) {
      const atMs = event.instants.get(field);
      if (atMs === undefined || event.source === null) return [];
      return [{ field, title, source: event.source, wall: String(event.values[field]), atMs }];
    }
    return event.pours.flatMap((pour): Moment[] => {
      const row = pour.rows.find((one) => one.pouredAtMs !== null && one.pouredAtMs === pour.atMs);
      // A pour without a number has no place in the order of pours.
      if (!row || pour.atMs === null || pour.pourNumber === null) return [];
      return [
        {
          field,
          title: `pour ${pour.pourNumber}`,
          source: row.source,
          wall: row.pouredAt ?? '',
          atMs: pour.atMs,
        },
      ];
    });
  });

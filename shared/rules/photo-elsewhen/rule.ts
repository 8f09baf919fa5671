import { toInstant, toWallClock } from '#shared/dates/wall-clock.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { lineEvents, type EventView } from '../line-events.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { photoPart } from '../photo-part.ts';
import { atMost } from '../slack.ts';
import type { FindingDraft, LineRule, PhotoFact } from '../types.ts';

const schema = paramsSchema({
  windowMin: {
    type: 'number',
    title: 'Time before the first and after the last time of an event',
    'x-unit': 'min',
    default: 30,
    minimum: 0,
    maximum: 100_000,
  },
});
const MINUTE_MS = 60_000;
const REWORK = 'rework';

/** The camera's instant; without an offset its clock is taken for the work order's. Null when it has none that is real. */
const takenAt = ({ facts }: PhotoFact, zone: string): number | null => {
  if (!facts) return null;
  if (facts.takenAtMs !== null) return facts.takenAtMs;
  if (facts.takenWall === null) return null;
  const instant = toInstant(facts.takenWall.slice(0, 16), zone);
  return 'ms' in instant ? instant.ms : null;
};

type Span = { readonly fromMs: number; readonly toMs: number };

/** From the first to the last known time of an event, its pours too. */
const spanOf = ({ instants, pours }: EventView): Span | null => {
  const times = [...instants.values(), ...pours.flatMap(({ atMs }) => (atMs === null ? [] : [atMs]))];
  if (times.length === 0) return null;
  return {
    fromMs: times.reduce((a, b) => Math.min(a, b)),
    toMs: times.reduce((a, b) => Math.max(a, b)),
  };
};

/** The end of the spans that is nearest to an instant, and how far off it is; 0 within one. */
const nearestEnd = (at: number, spans: readonly Span[]) => {
  const ends = spans.map(({ fromMs, toMs }) =>
    at < fromMs ? { end: fromMs, off: fromMs - at } : { end: toMs, off: Math.max(0, at - toMs) },
  );
  return ends.toSorted((a, b) => a.off - b.off)[0];
};

export const photoElsewhen: LineRule = {
  code: 'photo-elsewhen',
  title: 'Photograph of another time',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'structureNumber',
  needs: ['photos'],
  paramsSchema: schema,
  check: (line, params, { zone }) => {
    const windowMin = numberOf(params, schema, 'windowMin');
    const events = lineEvents(line);
    return (line.photos ?? []).flatMap((photo): FindingDraft[] => {
      const at = takenAt(photo, zone);
      if (at === null) return [];
      // A picture of rework belongs to a later event; any other may show what a later one left.
      const may = photo.view === REWORK ? events.filter(({ event }) => event > 1) : events;
      const near = nearestEnd(
        at,
        may.flatMap((event) => spanOf(event) ?? []),
      );
      if (!near || atMost(near.off / MINUTE_MS, windowMin)) return [];
      return [
        {
          part: photoPart(photo),
          measured: toWallClock(at, zone),
          limit: toWallClock(near.end, zone),
          margin: windowMin - near.off / MINUTE_MS,
          unit: 'min',
          params: { fileName: photo.fileName, view: photo.view, offMin: near.off / MINUTE_MS, windowMin },
        },
      ];
    });
  },
  message: ({ measured, limit, params }) =>
    `The photograph ${say(params['fileName'], null)} (${viewWord(String(params['view']))}) was taken at ${say(measured, 'clock')}, ${say(params['offMin'], 'min')} from the nearest time of the work (${say(limit, 'clock')}); ${say(params['windowMin'], 'min')} is allowed.`,
  remedy: () =>
    'Check the day and times written down, and the camera’s clock; hand in the photograph of the work, or say what this one shows.',
};

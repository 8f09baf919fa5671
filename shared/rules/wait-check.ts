import { say } from '#shared/findings/say.ts';
import type { Finding } from '#shared/findings/types.ts';
import { belowLimit } from './against-limit.ts';
import { missingTemperatures } from './fill.ts';
import { lastPour, lineEvents, type EventView } from './line-events.ts';
import { unproved } from './need.ts';
import type { FindingDraft, LineView } from './types.ts';
import { waitAfter } from './wait-after.ts';

const MINUTE_MS = 60_000;
const WORDS: ReadonlySet<unknown> = new Set(['not-by-us', 'not-yet']);

type Waited = {
  readonly line: LineView;
  readonly waitMin: number;
  /** Field that carries the time waited for, by event. */
  readonly fieldOf: (event: number) => string;
};

const checkEvent = (event: EventView, { line, waitMin, fieldOf }: Waited): readonly FindingDraft[] => {
  if (event.pours.length === 0) return [];
  const field = fieldOf(event.event);
  const place = { field, part: `event ${event.event}`, ...(event.source ? { source: event.source } : {}) };
  const said = event.values[field];
  if (said === undefined || said === null) return event.broken.has(field) ? [] : [unproved(field, place)];
  const at = event.instants.get(field);
  const last = lastPour(event);
  // A word is a value; a time that is not real has its own finding.
  if (WORDS.has(said) || at === undefined || last?.atMs === null || last?.atMs === undefined) return [];
  const wait = waitAfter({ pour: last, product: line.product, waitMin });
  const early = belowLimit({
    ...place,
    measured: (at - last.atMs) / MINUTE_MS,
    limit: wait.minutes,
    unit: 'min',
    params: { event: event.event, baseMin: waitMin, factor: wait.factor, coldestF: wait.coldestF },
  });
  return [...early, ...missingTemperatures(last.rows)];
};

/** Each event's last pour to a time of that event, against the wait lengthened for its coldest component. Minutes. */
export const waitedFor = (waited: Waited): readonly FindingDraft[] =>
  lineEvents(waited.line).flatMap((event) => checkEvent(event, waited));

/** End of the sentence that tells a wait too short. */
export const earlySentence = ({ measured, limit, params }: Finding): string => {
  const early = typeof measured === 'number' && measured < 0;
  const when = early
    ? `${say(-measured, 'min')} before the last pour`
    : `${say(measured, 'min')} after the last pour`;
  const cold =
    Number(params['factor']) > 1
      ? ` (${say(params['baseMin'], 'min')}, lengthened for components at ${say(params['coldestF'], 'degF')})`
      : '';
  return `${when}; ${say(limit, 'min')} is due${cold}.`;
};

import { toInstant } from '#shared/dates/wall-clock.ts';
import { say } from '#shared/findings/say.ts';
import type { Scalar, SourceRow } from '#shared/records/types.ts';
import { clockFields } from '../clock-chain.ts';
import { lineEvents } from '../line-events.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const WALL_CLOCK = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/;

/** End of the sentence for each problem of a wall clock. */
const PROBLEMS: Readonly<Record<string, string>> = {
  gap: 'did not happen: the clocks were set forward over it',
  overlap: 'happened twice: the clocks were set back over it',
  unreal: 'is on no calendar',
  zone: 'cannot be placed: the time zone of the work order is not known',
};

type Written = {
  readonly field: string;
  readonly source: SourceRow;
  readonly part: string;
  readonly value: Scalar | undefined;
};

const unreal = ({ field, source, part, value }: Written, zone: string): FindingDraft[] => {
  if (typeof value !== 'string' || !WALL_CLOCK.test(value)) return [];
  const instant = toInstant(value, zone);
  if (!('problem' in instant)) return [];
  const params = { zone, problem: instant.problem };
  return [{ field, source, part, measured: value, limit: null, margin: null, unit: null, params }];
};

export const clockUnreal: LineRule = {
  code: 'clock-unreal',
  title: 'Time not real',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'setAt',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { zone }) =>
    lineEvents(line).flatMap(({ event, source, values, instants, pours }) => [
      ...clockFields(line.kind, event).flatMap((field) =>
        source && !instants.has(field)
          ? unreal({ field, source, part: `event ${event}`, value: values[field] }, zone)
          : [],
      ),
      ...pours.flatMap((pour) =>
        pour.rows
          .filter((row) => row.pouredAtMs === null)
          .flatMap((row) =>
            unreal(
              {
                field: 'pouredAt',
                source: row.source,
                part: `event ${event} pour ${pour.pourNumber ?? '?'}`,
                value: row.pouredAt,
              },
              zone,
            ),
          ),
      ),
    ]),
  message: ({ measured, params }) =>
    `${say(measured, 'clock')} ${PROBLEMS[String(params['problem'])] ?? 'is no real time'} (${say(params['zone'], null)}).`,
  remedy: ({ params }) =>
    params['problem'] === 'overlap'
      ? 'Write a time outside the repeated hour, and say in the notes which of the two it was.'
      : 'Correct the time; if the clocks changed that night, write what a clock set right would have shown.',
};

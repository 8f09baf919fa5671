import { toWallClock } from '#shared/dates/wall-clock.ts';
import { say } from '#shared/findings/say.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';
import { lineEvents } from '../line-events.ts';
import { paramsSchema } from '../params.ts';
import { pourPart } from '../pour-part.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const MINUTE_MS = 60_000;

export const clockFuture: LineRule = {
  code: 'clock-future',
  title: 'Time still to come',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'setAt',
  needs: ['asOfMs'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { asOfMs, zone }) => {
    if (asOfMs === null) return [];
    const late = (atMs: number, draft: Partial<FindingDraft>): FindingDraft[] =>
      atMs <= asOfMs
        ? []
        : [
            {
              measured: null,
              limit: toWallClock(asOfMs, zone),
              unit: 'min',
              ...draft,
              margin: (asOfMs - atMs) / MINUTE_MS,
            },
          ];
    return lineEvents(line).flatMap(({ event, source, values, instants, pours }) => [
      ...[...instants].flatMap(([field, atMs]) =>
        late(atMs, {
          field,
          part: `event ${event} ${field}`,
          ...(source ? { source } : {}),
          measured: String(values[field]),
          params: { title: fieldTitle(event > 1 ? 'event' : line.kind, field) },
        }),
      ),
      ...pours.flatMap(({ rows }) =>
        rows.flatMap((pour) =>
          late(pour.pouredAtMs ?? -Infinity, {
            field: 'pouredAt',
            part: pourPart(pour),
            source: pour.source,
            measured: pour.pouredAt,
            params: { title: fieldTitle('pour', 'pouredAt') },
          }),
        ),
      ),
    ]);
  },
  message: ({ measured, limit, params }) =>
    `${say(params['title'], null)} is ${say(measured, 'clock')}, which had not come yet when this was handed in (${say(limit, 'clock')}).`,
  remedy: () => 'Correct the time, its day and year too; what is not done yet is "not yet".',
};

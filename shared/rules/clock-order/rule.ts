import { say } from '#shared/findings/say.ts';
import { clockChain } from '../clock-chain.ts';
import { lineEvents } from '../line-events.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule } from '../types.ts';

const MINUTE_MS = 60_000;

export const clockOrder: LineRule = {
  code: 'clock-order',
  title: 'Times out of order',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'setAt',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line) =>
    lineEvents(line).flatMap((event) => {
      const chain = clockChain(line, event);
      return chain.flatMap((moment, index): FindingDraft[] => {
        const before = chain[index - 1];
        if (!before || moment.atMs >= before.atMs) return [];
        return [
          {
            field: moment.field,
            source: moment.source,
            part: `event ${event.event}, ${before.title}, ${moment.title}`,
            measured: moment.wall,
            limit: before.wall,
            margin: (moment.atMs - before.atMs) / MINUTE_MS,
            unit: 'min',
            params: {
              event: event.event,
              before: before.title,
              after: moment.title,
              beforeField: before.field,
            },
          },
        ];
      });
    }),
  message: ({ measured, limit, margin, params }) =>
    `The time of ${say(params['after'], null)}, ${say(measured, 'clock')}, is ${say(margin === null ? null : -margin, 'min')} before the time of ${say(params['before'], null)}, ${say(limit, 'clock')}.`,
  remedy: () => 'Correct whichever of the two times was written down wrongly, its day too.',
};

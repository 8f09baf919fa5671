import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { missingTemperatures } from '../fill.ts';
import { lineEvents } from '../line-events.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';
import { waitAfter } from '../wait-after.ts';

const MINUTE_MS = 60_000;

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait between one pour and the next',
    'x-unit': 'min',
    default: 3,
    minimum: 0,
    maximum: 10_000,
  },
});

export const liftEarly: LineRule = {
  code: 'lift-early',
  title: 'Lift early',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'pouredAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    lineEvents(line).flatMap(({ event, pours }) =>
      pours.flatMap((pour, index) => {
        const before = pours[index - 1];
        // A pour without a number has no place in the order.
        if (!before || before.atMs === null || pour.atMs === null || pour.pourNumber === null) return [];
        const waitMin = numberOf(params, schema, 'waitMin');
        const wait = waitAfter({ pour: before, product: line.product, waitMin });
        const early = belowLimit({
          ...(pour.rows[0] ? { source: pour.rows[0].source } : {}),
          part: `event ${event} pour ${pour.pourNumber ?? '?'}`,
          measured: (pour.atMs - before.atMs) / MINUTE_MS,
          limit: wait.minutes,
          unit: 'min',
          params: {
            event,
            pourNumber: pour.pourNumber,
            baseMin: waitMin,
            factor: wait.factor,
            coldestF: wait.coldestF,
          },
        });
        return [...early, ...missingTemperatures(before.rows)];
      }),
    ),
  message: ({ measured, limit, params }) => {
    const pour = `Pour ${say(params['pourNumber'], null)}`;
    if (typeof measured === 'number' && measured < 0)
      return `${pour} ended ${say(-measured, 'min')} before the pour it stands on.`;
    return `${pour} ended ${say(measured, 'min')} after the one before it; ${say(limit, 'min')} is due for that one to rise.`;
  },
  remedy: () => 'Check the times of both pours and their numbers; a lift goes on foam that has risen.',
};

import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { atMost } from '../slack.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitIn: {
    type: 'number',
    title: 'Greatest depth of water with the structure in the bore',
    'x-unit': 'in',
    default: 2,
    minimum: 0,
    maximum: 120,
  },
});

const INCHES = 12;

export const waterDeep: LineRule = {
  code: 'water-deep',
  title: 'Water deep',
  kinds: ['set', 'straighten'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'waterIn',
  needs: [],
  paramsSchema: schema,
  check: (line, settings) => {
    const limit = numberOf(settings, schema, 'limitIn');
    const later = line.events.flatMap((event) => {
      const waterIn = event.values['waterIn'];
      if (typeof waterIn !== 'number') return [];
      const params = { waterIn, event: event.event };
      return aboveLimit({
        source: event.source,
        part: `event ${event.event}`,
        measured: waterIn,
        limit,
        unit: 'in',
        params,
      });
    });
    const { numbers, missing } = needNumbers(line, ['waterIn']);
    if (missing) return [...missing, ...later];
    // Water stands at least as high with the pole in as it did in the open bore.
    const measured = line.derived.waterWithPoleIn ?? numbers.waterIn;
    const { boreDepthFt } = line.values;
    const boreIn = typeof boreDepthFt === 'number' ? boreDepthFt * INCHES : null;
    const overflows = boreIn !== null && !atMost(numbers.waterIn, boreIn);
    const params = { waterIn: numbers.waterIn, event: 1, ...(overflows ? { boreIn } : {}) };
    return [...aboveLimit({ measured, limit, unit: 'in', params }), ...later];
  },
  message: ({ measured, limit, params }) =>
    params['boreIn'] !== undefined
      ? `${say(params['waterIn'], 'in')} of water is more than the bore is deep, ${say(params['boreIn'], 'in')}; ${say(limit, 'in')} is allowed with the pole in it.`
      : measured === params['waterIn']
        ? `Water stands ${say(measured, 'in')} deep; ${say(limit, 'in')} is allowed with the structure in the bore.`
        : `${say(params['waterIn'], 'in')} of water in the open bore stands ${say(measured, 'in')} deep with the pole in it; ${say(limit, 'in')} is allowed.`,
  remedy: ({ params }) =>
    params['boreIn'] !== undefined
      ? 'Correct the depth of water or of the bore: one of them was written down wrongly, in another unit perhaps.'
      : 'Check the depth of water and how it was measured; water must be bailed before foam is poured.',
};

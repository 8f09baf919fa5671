import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  toleranceFt: {
    type: 'number',
    title: 'Tolerance of the sum of depths',
    'x-unit': 'ft',
    default: 0.1,
    minimum: 0,
    maximum: 5,
  },
});

export const boreShallow: LineRule = {
  code: 'bore-shallow',
  title: 'Bore shallow',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'boreDepthFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['boreDepthFt', 'embedmentFt']);
    if (missing) return missing;
    if (line.broken.has('bedFt')) return [];
    const bed = line.values['bedFt'];
    const bedFt = typeof bed === 'number' ? bed : 0;
    return belowLimit({
      measured: numbers.boreDepthFt,
      limit: numbers.embedmentFt + bedFt - numberOf(params, schema, 'toleranceFt'),
      unit: 'ft',
      params: { embedmentFt: numbers.embedmentFt, bedFt },
    });
  },
  message: ({ measured, params }) =>
    Number(params['bedFt']) > 0
      ? `The bore is ${say(measured, 'ft')} deep, but the embedment of ${say(params['embedmentFt'], 'ft')} and the bed of ${say(params['bedFt'], 'ft')} need more.`
      : `The bore is ${say(measured, 'ft')} deep, but the embedment is ${say(params['embedmentFt'], 'ft')}: the pole cannot stand deeper than its bore.`,
  remedy: () => 'Correct the bore depth, the bed or the embedment: one of them was written down wrongly.',
};

import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { atMost } from '../slack.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  toleranceFt: {
    type: 'number',
    title: 'Difference allowed',
    'x-unit': 'ft',
    default: 0.5,
    minimum: 0,
    maximum: 10,
  },
  shortPoleBrandFt: {
    type: 'number',
    title: 'Brand from the butt, shorter poles',
    'x-unit': 'ft',
    default: 10,
    minimum: 1,
    maximum: 40,
  },
  longPoleBrandFt: {
    type: 'number',
    title: 'Brand from the butt, longer poles',
    'x-unit': 'ft',
    default: 14,
    minimum: 1,
    maximum: 40,
  },
  shortPoleUpToFt: {
    type: 'number',
    title: 'Length up to which a pole is a shorter one',
    'x-unit': 'ft',
    default: 50,
    minimum: 10,
    maximum: 200,
  },
});

export const brandDiffers: LineRule = {
  code: 'brand-differs',
  title: 'Brand differs',
  kinds: ['set'],
  scope: 'line',
  severity: 'query',
  field: 'brandHeightFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['poleLengthFt', 'embedmentFt', 'brandHeightFt']);
    if (missing) return missing;
    const { poleLengthFt, embedmentFt, brandHeightFt } = numbers;
    const short = atMost(poleLengthFt, numberOf(params, schema, 'shortPoleUpToFt'));
    const brandFt = numberOf(params, schema, short ? 'shortPoleBrandFt' : 'longPoleBrandFt');
    const impliedFt = brandFt - brandHeightFt;
    return aboveLimit({
      measured: Math.abs(impliedFt - embedmentFt),
      limit: numberOf(params, schema, 'toleranceFt'),
      unit: 'ft',
      params: { impliedFt, embedmentFt, brandFt, brandHeightFt },
    });
  },
  message: ({ measured, limit, params }) =>
    `A brand ${say(params['brandHeightFt'], 'ft')} above grade on a pole branded ${say(params['brandFt'], 'ft')} from the butt means ${say(params['impliedFt'], 'ft')} in the ground, not the ${say(params['embedmentFt'], 'ft')} written down: ${say(measured, 'ft')} apart, where ${say(limit, 'ft')} is allowed.`,
  remedy: () => 'Measure the brand above the low-side ground line again, and the embedment.',
};

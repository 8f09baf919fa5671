import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { depthUncertaintyFt } from '../depth-uncertainty.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  leastShare: {
    type: 'number',
    title: 'Least share of the embedment that is foamed',
    'x-unit': 'ratio',
    default: 0.5,
    minimum: 0,
    maximum: 1,
  },
});

export const gapShallow: LineRule = {
  code: 'gap-shallow',
  title: 'Gap filled shallow',
  kinds: ['straighten'],
  scope: 'line',
  severity: 'query',
  field: 'gapDepthFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['gapDepthFt', 'embedmentFt']);
    if (missing) return missing;
    const share = numberOf(params, schema, 'leastShare');
    return belowLimit({
      measured: numbers.gapDepthFt,
      limit: share * numbers.embedmentFt,
      unit: 'ft',
      uncertainty: depthUncertaintyFt(line),
      params: { embedmentFt: numbers.embedmentFt, share },
    });
  },
  message: ({ measured, limit, params }) =>
    `The gap was filled ${say(measured, 'ft')} deep; at least ${say(limit, 'ft')} is due of ${say(params['embedmentFt'], 'ft')} in the ground.`,
  remedy: () =>
    'Check how deep the gap was open and filled, and the embedment; or say what kept it from opening.',
};

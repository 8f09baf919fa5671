import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { depthUncertaintyFt } from '../depth-uncertainty.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  allowanceFt: {
    type: 'number',
    title: 'Allowance above the depth due',
    'x-unit': 'ft',
    default: 1.5,
    minimum: 0,
    maximum: 20,
  },
});

export const embedmentDeep: LineRule = {
  code: 'embedment-deep',
  title: 'Embedment deep',
  kinds: ['set'],
  scope: 'line',
  severity: 'query',
  field: 'embedmentFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['embedmentFt']);
    if (missing) return missing;
    const due = line.derived.dueFt;
    if (due === null) return [];
    return aboveLimit({
      measured: numbers.embedmentFt,
      limit: due + numberOf(params, schema, 'allowanceFt'),
      unit: 'ft',
      uncertainty: depthUncertaintyFt(line),
      params: { dueFt: due },
    });
  },
  message: ({ measured, limit, params }) =>
    `The pole is set ${say(measured, 'ft')} deep where ${say(params['dueFt'], 'ft')} is due; over ${say(limit, 'ft')} the pole stands lower than its length was chosen for.`,
  remedy: () => 'Check the embedment and the pole length, or say why the pole was set so deep.',
};

import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { depthUncertaintyFt } from '../depth-uncertainty.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  toleranceFt: {
    type: 'number',
    title: 'Tolerance below the depth due',
    'x-unit': 'ft',
    default: 0,
    minimum: 0,
    maximum: 5,
  },
});

export const embedmentShort: LineRule = {
  code: 'embedment-short',
  title: 'Embedment short',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'embedmentFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['embedmentFt']);
    if (missing) return missing;
    const due = line.derived.dueFt;
    if (due === null) return [];
    const limit = due - numberOf(params, schema, 'toleranceFt');
    return belowLimit({
      measured: numbers.embedmentFt,
      limit,
      unit: 'ft',
      uncertainty: depthUncertaintyFt(line),
      params: { dueFt: due },
    });
  },
  message: ({ measured, limit }) =>
    `The pole is set ${say(measured, 'ft')} deep; at least ${say(limit, 'ft')} is due.`,
  remedy: () =>
    'Correct the embedment if it was written down wrongly; otherwise the pole must be set deeper, or a concession asked for.',
};

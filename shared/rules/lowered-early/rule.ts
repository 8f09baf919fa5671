import { say } from '#shared/findings/say.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';
import { earlySentence, waitedFor } from '../wait-check.ts';

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait from the last pour to lowering',
    'x-unit': 'min',
    default: 5,
    minimum: 0,
    maximum: 10_000,
  },
});

export const loweredEarly: LineRule = {
  code: 'lowered-early',
  title: 'Lowered early',
  kinds: ['relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'loweredAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    waitedFor({ line, waitMin: numberOf(params, schema, 'waitMin'), fieldOf: () => 'loweredAt' }),
  message: (finding) => `The pad was lowered ${earlySentence(finding)}`,
  remedy: ({ limit }) =>
    `Check the time of the last pour and of the lowering; the foam must carry the pad, ${say(limit, 'min')} after the pour.`,
};

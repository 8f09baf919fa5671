import { say } from '#shared/findings/say.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';
import { earlySentence, waitedFor } from '../wait-check.ts';

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait from the last pour to letting go of the pole',
    'x-unit': 'min',
    default: 3,
    minimum: 0,
    maximum: 10_000,
  },
});

export const letGoEarly: LineRule = {
  code: 'let-go-early',
  title: 'Let go early',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'letGoAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    waitedFor({ line, waitMin: numberOf(params, schema, 'waitMin'), fieldOf: () => 'letGoAt' }),
  message: (finding) => `The pole was let go ${earlySentence(finding)}`,
  remedy: ({ limit }) =>
    `Check the time of the last pour and when the pole was let go; it is held until the foam is firm, ${say(limit, 'min')} after the pour.`,
};

import { say } from '#shared/findings/say.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';
import { earlySentence, waitedFor } from '../wait-check.ts';

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait from the last pour to line tension',
    'x-unit': 'min',
    default: 60,
    minimum: 0,
    maximum: 10_000,
  },
});

export const loadEarly: LineRule = {
  code: 'load-early',
  title: 'Load early',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'loadAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    waitedFor({ line, waitMin: numberOf(params, schema, 'waitMin'), fieldOf: () => 'loadAt' }),
  message: (finding) => `Line tension came on the pole ${earlySentence(finding)}`,
  remedy: ({ limit }) =>
    `Check the time of the last pour and when line tension came on; the foam needs ${say(limit, 'min')} before it carries the line.`,
};

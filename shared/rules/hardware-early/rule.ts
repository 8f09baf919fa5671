import { say } from '#shared/findings/say.ts';
import { earlySentence, waitedFor } from '../wait-check.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait from the last pour to the first work',
    'x-unit': 'min',
    default: 15,
    minimum: 0,
    maximum: 10_000,
  },
});

export const hardwareEarly: LineRule = {
  code: 'hardware-early',
  title: 'Hardware early',
  kinds: ['set', 'straighten'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'hardwareAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    waitedFor({
      line,
      waitMin: numberOf(params, schema, 'waitMin'),
      // The Events sheet has one column for both kinds.
      fieldOf: (event) => (line.kind === 'straighten' && event === 1 ? 'reattachedAt' : 'hardwareAt'),
    }),
  message: (finding) => `First work on the pole began ${earlySentence(finding)}`,
  remedy: ({ limit }) =>
    `Check the time of the last pour and of the first work; the foam needs ${say(limit, 'min')} before it is loaded.`,
};

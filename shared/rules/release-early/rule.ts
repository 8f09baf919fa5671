import { say } from '#shared/findings/say.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';
import { earlySentence, waitedFor } from '../wait-check.ts';

const schema = paramsSchema({
  waitMin: {
    type: 'number',
    title: 'Wait from the last pour to release',
    'x-unit': 'min',
    default: 15,
    minimum: 0,
    maximum: 10_000,
  },
});

export const releaseEarly: LineRule = {
  code: 'release-early',
  title: 'Release early',
  kinds: ['straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'releasedAt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    waitedFor({ line, waitMin: numberOf(params, schema, 'waitMin'), fieldOf: () => 'releasedAt' }),
  message: (finding) => `It was released ${earlySentence(finding)}`,
  remedy: ({ limit }) =>
    `Check the time of the last pour and of the release; what holds it up stays on for ${say(limit, 'min')} after the pour.`,
};

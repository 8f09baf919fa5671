import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitInPerFt: {
    type: 'number',
    title: 'Greatest slope of the pad after work, either way',
    'x-unit': 'in-per-ft',
    default: 0.25,
    minimum: 0,
    maximum: 6,
  },
});
const WAYS = [
  ['slopeAfterAlongInPerFt', 'front to back'],
  ['slopeAfterAcrossInPerFt', 'side to side'],
] as const;

export const padSlope: LineRule = {
  code: 'pad-slope',
  title: 'Pad out of level',
  kinds: ['relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'slopeAfterAlongInPerFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) =>
    WAYS.flatMap(([field, way]) => {
      const { numbers, missing } = needNumbers(line, [field]);
      if (missing) return missing;
      return aboveLimit({
        field,
        part: field,
        measured: Math.abs(numbers[field]),
        limit: numberOf(params, schema, 'limitInPerFt'),
        unit: 'in-per-ft',
        params: { way },
      });
    }),
  message: ({ measured, limit, params }) =>
    `The pad slopes ${say(measured, 'in-per-ft')} ${say(params['way'], null)} after work; ${say(limit, 'in-per-ft')} is allowed.`,
  remedy: () => 'Check the reading of the level; a pad that is out of level must be raised and filled again.',
};

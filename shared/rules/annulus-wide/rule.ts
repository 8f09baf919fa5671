import { greatestAnnulusIn } from '#shared/calc/annulus.ts';
import { SIZE_FIELDS, withoutClass } from '#shared/records/size-fields.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  greatestGapIn: {
    type: 'number',
    title: 'Greatest annulus',
    'x-unit': 'in',
    default: 6,
    minimum: 0,
    maximum: 60,
  },
});

export const annulusWide: LineRule = {
  code: 'annulus-wide',
  title: 'Annulus wide',
  kinds: ['set'],
  scope: 'line',
  severity: 'query',
  field: 'boreTopIn',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    // A blank stands for its default, an unreadable reading for nothing.
    if (withoutClass(SIZE_FIELDS, line).some((field) => line.broken.has(field))) return [];
    const measured = greatestAnnulusIn(line.values);
    if (measured === null) return [];
    return aboveLimit({ measured, limit: numberOf(params, schema, 'greatestGapIn'), unit: 'in' });
  },
  message: ({ measured, limit }) =>
    `The widest space between bore and pole is ${say(measured, 'in')}, from the sizes of both; ${say(limit, 'in')} is the most that is expected.`,
  remedy: () =>
    'Check the bore and pole sizes; if the bore caved in or was reamed so wide, say so and how it was filled.',
};

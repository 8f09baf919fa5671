import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  leastGapIn: {
    type: 'number',
    title: 'Least annulus',
    'x-unit': 'in',
    default: 2,
    minimum: 0,
    maximum: 24,
  },
});

export const annulusNarrow: LineRule = {
  code: 'annulus-narrow',
  title: 'Annulus narrow',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'boreTopIn',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const gap = line.values['leastGapIn'];
    const taped = typeof gap === 'number';
    const measured = taped ? gap : line.derived.leastAnnulusIn;
    if (measured === null || line.broken.has('leastGapIn')) return [];
    return belowLimit({
      field: taped ? 'leastGapIn' : 'boreTopIn',
      measured,
      limit: numberOf(params, schema, 'leastGapIn'),
      unit: 'in',
      params: { taped },
    });
  },
  message: ({ measured, limit, params }) =>
    typeof measured === 'number' && measured < 0
      ? `The pole is wider than its bore by ${say(-2 * measured, 'in')} as written down.`
      : `The least space between bore and pole is ${say(measured, 'in')}${params['taped'] === true ? '' : ', from the sizes of both,'} and at least ${say(limit, 'in')} is due all round for the foam to run.`,
  remedy: () =>
    'Check the bore and pole sizes, or the measured gap; a bore that is too narrow must be reamed.',
};

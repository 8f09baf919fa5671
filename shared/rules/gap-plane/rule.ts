import { gapsOf, planeDepartureIn } from '#shared/calc/relevel-void.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitIn: {
    type: 'number',
    title: 'Greatest departure of the four gaps from a plane',
    'x-unit': 'in',
    default: 0.5,
    minimum: 0,
    maximum: 24,
  },
});

export const gapPlane: LineRule = {
  code: 'gap-plane',
  title: 'Gaps not in a plane',
  kinds: ['relevel'],
  scope: 'line',
  severity: 'query',
  field: 'gap1In',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const gaps = gapsOf(line.values);
    // All four are required: a blank one has its finding.
    if (gaps === null) return [];
    return aboveLimit({
      measured: planeDepartureIn(gaps),
      limit: numberOf(params, schema, 'limitIn'),
      unit: 'in',
      params: { gaps: [...gaps] },
    });
  },
  message: ({ measured, limit, params }) =>
    `The gaps at the four corners (${say(params['gaps'], 'in')}) are ${say(measured, 'in')} from those of a flat pad; ${say(limit, 'in')} is allowed.`,
  remedy: () =>
    'Measure the four corners again, in the order that the sheet shows; a pad that is cracked or bent must be told.',
};

import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { fillOf } from '../fill.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  leastRatio: {
    type: 'number',
    title: 'Least fill ratio',
    'x-unit': 'ratio',
    default: 1,
    minimum: 0,
    maximum: 5,
  },
});

export const fillShort: LineRule = {
  code: 'fill-short',
  title: 'Fill short',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'boreDepthFt',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { fill, missing } = fillOf(line);
    if (missing) return missing;
    // Where there is no void nothing is short; that there is none is told by fill-excess.
    if (fill.ratio === null) return [];
    return belowLimit({
      field: fill.field,
      measured: fill.ratio,
      limit: numberOf(params, schema, 'leastRatio'),
      unit: 'ratio',
      uncertainty: line.derived.fillRatioU,
      params: { placedFt3: fill.placedFt3, voidFt3: fill.voidFt3, measureAgain: line.derived.worstReading },
    });
  },
  message: ({ measured, limit, params }) =>
    `${say(params['placedFt3'], 'ft3')} of foam was placed for a void of ${say(params['voidFt3'], 'ft3')}: fill ratio ${say(measured, 'ratio')}, at least ${say(limit, 'ratio')} is due.`,
  remedy: () =>
    'Check the sizes and the kits poured; if they are right, the void is not full and must be topped up (add it as an event).',
};

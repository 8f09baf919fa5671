import { BUTT_FIELDS, GROUND_LINE_FIELDS, sectionOf } from '#shared/calc/pole-sizes.ts';
import { sizeFromGirth } from '#shared/calc/section.ts';
import { positiveOf } from '#shared/calc/values.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitIn: {
    type: 'number',
    title: 'Difference allowed between the size by girth and by diameter',
    'x-unit': 'in',
    default: 0.25,
    minimum: 0,
    maximum: 12,
  },
});
const ENDS = [
  [...GROUND_LINE_FIELDS, 'the ground line'],
  [...BUTT_FIELDS, 'the butt'],
] as const;

export const sizeDiffers: LineRule = {
  code: 'size-differs',
  title: 'Sizes differ',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'girthGroundLineIn',
  needs: [],
  paramsSchema: schema,
  check: ({ values, broken }, params) => {
    const section = sectionOf(values);
    if (section === null || broken.has('poleSection')) return [];
    return ENDS.flatMap(([girthField, diameterField, where]) => {
      const girthIn = positiveOf(values, girthField);
      const diameterIn = positiveOf(values, diameterField);
      if (girthIn === null || diameterIn === null) return [];
      const byGirthIn = sizeFromGirth(section, girthIn);
      return aboveLimit({
        field: girthField,
        part: girthField,
        measured: Math.abs(byGirthIn - diameterIn),
        limit: numberOf(params, schema, 'limitIn'),
        unit: 'in',
        params: { where, girthIn, byGirthIn, diameterIn },
      });
    });
  },
  message: ({ measured, limit, params }) =>
    `At ${say(params['where'], null)} a girth of ${say(params['girthIn'], 'in')} makes ${say(params['byGirthIn'], 'in')} across, and ${say(params['diameterIn'], 'in')} is written down: ${say(measured, 'in')} apart, where ${say(limit, 'in')} is allowed. The girth counts.`,
  remedy: () => 'Tape the girth again, and leave the diameter blank or make it agree.',
};

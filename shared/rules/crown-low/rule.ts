import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const FIELD = 'foamTopBelowGradeIn';

const schema = paramsSchema({
  deepestBelowGradeIn: {
    type: 'number',
    title: 'Greatest depth of the finished foam below grade',
    'x-unit': 'in',
    default: 0,
    minimum: -24,
    maximum: 120,
  },
});

export const crownLow: LineRule = {
  code: 'crown-low',
  title: 'Foam finished low',
  kinds: ['set'],
  scope: 'line',
  severity: 'query',
  field: FIELD,
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const limit = numberOf(params, schema, 'deepestBelowGradeIn');
    // The level that counts is the one the last event left; what was found before it stays on the record.
    const last = line.events.findLast((event) => typeof event.values[FIELD] === 'number');
    if (last) {
      const measured = Number(last.values[FIELD]);
      return aboveLimit({ source: last.source, measured, limit, unit: 'in', params: { event: last.event } });
    }
    const { numbers, missing } = needNumbers(line, [FIELD]);
    if (missing) return missing;
    return aboveLimit({ measured: numbers[FIELD], limit, unit: 'in' });
  },
  message: ({ measured, limit }) =>
    limit === 0
      ? `The foam finished ${say(measured, 'in')} below grade; it must reach grade.`
      : `The foam finished ${say(measured, 'in')} below grade; no lower than ${say(limit, 'in')} is allowed.`,
  remedy: () => 'Top the foam up to grade (add it as an event), or say what fills the bore above it.',
};

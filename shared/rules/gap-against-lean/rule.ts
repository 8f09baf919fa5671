import { leanChange } from '#shared/calc/lean.ts';
import { numberOf as valueOf } from '#shared/calc/values.ts';
import { say } from '#shared/findings/say.ts';
import { aboveLimit, belowLimit } from '../against-limit.ts';
import { needNumbers } from '../need.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  factor: {
    type: 'number',
    title: 'Factor within which the gap agrees',
    'x-unit': 'ratio',
    default: 2,
    minimum: 1,
    maximum: 100,
  },
});
/** Leans are told by 10 ft of height. */
const PER_FT = 10;
const LEANS = [
  'leanBeforeInPer10Ft',
  'leanBeforeAzimuthDeg',
  'leanAfterInPer10Ft',
  'leanAfterAzimuthDeg',
] as const;

export const gapAgainstLean: LineRule = {
  code: 'gap-against-lean',
  title: 'Gap against lean',
  kinds: ['straighten'],
  scope: 'line',
  severity: 'query',
  field: 'gapAtGradeIn',
  needs: [],
  paramsSchema: schema,
  check: (line, params) => {
    const { numbers, missing } = needNumbers(line, ['gapAtGradeIn', 'gapDepthFt']);
    if (missing) return missing;
    if (LEANS.some((field) => line.broken.has(field))) return [];
    const [before, beforeAzimuth, after, afterAzimuth] = LEANS.map((field) => valueOf(line.values, field));
    // Leans that are not recorded are the matter of `lean-unproved`.
    if (typeof before !== 'number' || typeof after !== 'number') return [];
    const change = leanChange(
      { inPer10Ft: before, azimuthDeg: beforeAzimuth ?? null },
      { inPer10Ft: after, azimuthDeg: afterAzimuth ?? null },
    );
    if (change === null) return [];
    const expected = (change * numbers.gapDepthFt) / PER_FT;
    const factor = numberOf(params, schema, 'factor');
    const compared = { measured: numbers.gapAtGradeIn, unit: 'in', params: { expected, change, factor } };
    return [
      ...belowLimit({ ...compared, part: 'narrow', limit: expected / factor }),
      ...aboveLimit({ ...compared, part: 'wide', limit: expected * factor }),
    ];
  },
  message: ({ measured, params }) =>
    `The gap at grade is ${say(measured, 'in')}, where a change of lean of ${say(params['change'], 'in-per-10ft')} opens some ${say(params['expected'], 'in')}.`,
  remedy: () =>
    'Check the gap at grade, its depth and the leans before and after; or say what else moved (soil, a pole that bent).',
};

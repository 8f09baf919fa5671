import { say } from '#shared/findings/say.ts';
import { aboveLimit } from '../against-limit.ts';
import { fillOf } from '../fill.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { atMost } from '../slack.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  greatestRatio: {
    type: 'number',
    title: 'Greatest fill ratio',
    'x-unit': 'ratio',
    default: 1.5,
    minimum: 0.5,
    maximum: 20,
  },
});

/** What may be larger than it was written down, and where to look first. */
const SPACE = {
  set: { may: 'The bore may be', look: 'the bore sizes' },
  straighten: { may: 'The gap may be', look: 'the gaps, their width and depth' },
  relevel: { may: 'The gaps may be', look: 'the gaps, the pad and its opening' },
} as const;

export const fillExcess: LineRule = {
  code: 'fill-excess',
  title: 'Fill excessive',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'boreDepthFt',
  needs: [],
  paramsSchema: schema,
  check: (line, settings) => {
    const { fill, missing } = fillOf(line);
    if (missing) return missing;
    const limit = numberOf(settings, schema, 'greatestRatio');
    const surplusFt3 = fill.placedFt3 - fill.voidFt3;
    // One kit is the least a crew can add: what is left of it is no sign of anything.
    if (fill.smallestKitFt3 !== null && atMost(surplusFt3, fill.smallestKitFt3)) return [];
    const params = {
      placedFt3: fill.placedFt3,
      voidFt3: fill.voidFt3,
      surplusFt3,
      measureAgain: line.derived.worstReading,
    };
    if (fill.ratio === null)
      return [{ field: fill.field, measured: null, limit, margin: null, unit: 'ratio', params }];
    return aboveLimit({
      field: fill.field,
      measured: fill.ratio,
      limit,
      unit: 'ratio',
      uncertainty: line.derived.fillRatioU,
      params,
    });
  },
  message: ({ kind, measured, limit, params }) =>
    measured === null
      ? `${say(params['placedFt3'], 'ft3')} of foam was placed where the readings leave no void at all.`
      : `${say(params['placedFt3'], 'ft3')} of foam was placed for a void of ${say(params['voidFt3'], 'ft3')}: fill ratio ${say(measured, 'ratio')}, over ${say(limit, 'ratio')}. ${SPACE[kind ?? 'set'].may} larger than written down, or foam ran off.`,
  remedy: ({ kind }) => `Check ${SPACE[kind ?? 'set'].look} and the kits poured, or say where the foam went.`,
};

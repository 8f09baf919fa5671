import { geodesicDistanceM } from '#shared/calc/geodesic-distance.ts';
import { designOf } from '#shared/check/context-keys.ts';
import { say } from '#shared/findings/say.ts';
import { mToFt } from '#shared/units/convert.ts';
import { aboveLimit } from '../against-limit.ts';
import { statedPlace } from '../line-place.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitFt: {
    type: 'number',
    title: 'Greatest distance from the design position',
    'x-unit': 'ft',
    default: 15,
    minimum: 0,
    maximum: 5280,
  },
});

export const positionOff: LineRule = {
  code: 'position-off',
  title: 'Off its position',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'latitude',
  needs: ['design'],
  paramsSchema: schema,
  check: (line, params, context) => {
    const stated = statedPlace(line);
    const design = designOf(context, line);
    if (!stated || !design || design.latitude === null || design.longitude === null) return [];
    const { latitude, longitude } = design;
    const metres = geodesicDistanceM(stated.place, { latitude, longitude });
    if (metres === null) return [];
    const distanceFt = mToFt(metres);
    return aboveLimit({
      measured: distanceFt - stated.accuracyFt,
      limit: numberOf(params, schema, 'limitFt'),
      unit: 'ft',
      params: { distanceFt, accuracyFt: stated.accuracyFt },
    });
  },
  message: ({ limit, params }) => {
    const accuracy =
      params['accuracyFt'] === 0 ? '' : `, ${say(params['accuracyFt'], 'ft')} of accuracy allowed for`;
    return `The structure stands ${say(params['distanceFt'], 'ft')} from where the work order has it; ${say(limit, 'ft')} is allowed${accuracy}.`;
  },
  remedy: () =>
    'Check latitude, longitude and structure number; if it was moved, answer who agreed to the place.',
};

import { geodesicDistanceM } from '#shared/calc/geodesic-distance.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { mToFt } from '#shared/units/convert.ts';
import { aboveLimit } from '../against-limit.ts';
import { statedPlace } from '../line-place.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { photoPart } from '../photo-part.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  limitFt: {
    type: 'number',
    title: 'Greatest distance of a photograph from its structure',
    'x-unit': 'ft',
    default: 150,
    minimum: 0,
    maximum: 52_800,
  },
});

export const photoElsewhere: LineRule = {
  code: 'photo-elsewhere',
  title: 'Photograph of another place',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'query',
  field: 'latitude',
  needs: ['photos'],
  paramsSchema: schema,
  check: (line, params) => {
    const stated = statedPlace(line);
    if (!stated) return [];
    return (line.photos ?? []).flatMap((photo) => {
      const { latitude = null, longitude = null } = photo.facts ?? {};
      if (latitude === null || longitude === null) return [];
      const metres = geodesicDistanceM(stated.place, { latitude, longitude });
      if (metres === null) return [];
      return aboveLimit({
        part: photoPart(photo),
        measured: mToFt(metres),
        limit: numberOf(params, schema, 'limitFt'),
        unit: 'ft',
        params: { fileName: photo.fileName, view: photo.view },
      });
    });
  },
  message: ({ measured, limit, params }) =>
    `The photograph ${say(params['fileName'], null)} (${viewWord(String(params['view']))}) was taken ${say(measured, 'ft')} from where the structure stands; ${say(limit, 'ft')} is allowed.`,
  remedy: () =>
    'Check the position written down; hand in the photograph that was taken here, or say where this one was taken.',
};

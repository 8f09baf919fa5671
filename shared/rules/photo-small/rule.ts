import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { numberOf, paramsSchema } from '../params.ts';
import { photoPart } from '../photo-part.ts';
import type { LineRule } from '../types.ts';

const schema = paramsSchema({
  leastEdgePx: {
    type: 'number',
    title: 'Least long edge',
    'x-unit': 'px',
    default: 1000,
    minimum: 1,
    maximum: 20_000,
  },
});

export const photoSmall: LineRule = {
  code: 'photo-small',
  title: 'Photograph small',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'note',
  field: 'structureNumber',
  needs: ['photos'],
  paramsSchema: schema,
  check: ({ photos }, params) =>
    (photos ?? []).flatMap((photo) => {
      const { width = null, height = null } = photo.facts ?? {};
      if (width === null || height === null) return [];
      return belowLimit({
        part: photoPart(photo),
        measured: Math.max(width, height),
        limit: numberOf(params, schema, 'leastEdgePx'),
        unit: 'px',
        params: { fileName: photo.fileName, view: photo.view },
      });
    }),
  message: ({ measured, limit, params }) =>
    `The photograph ${say(params['fileName'], null)} (${viewWord(String(params['view']))}) is ${say(measured, 'px')} along its long edge; ${say(limit, 'px')} is needed to read a tape or a label.`,
  remedy: () => 'Hand in the file as the camera wrote it.',
};

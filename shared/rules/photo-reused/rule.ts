import { structureKey } from '#shared/records/structure-key.ts';
import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import { byTelling, photosBySha, tellOther } from '../photo-index.ts';
import { photoPart } from '../photo-part.ts';
import type { FindingDraft, LineRule } from '../types.ts';

export const photoReused: LineRule = {
  code: 'photo-reused',
  title: 'Photograph reused',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: ['photos', 'otherPhotos'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, context) => {
    const own = structureKey(line.structureNumber);
    return (line.photos ?? []).flatMap((photo): FindingDraft[] => {
      const twins = photosBySha(context).get(photo.sha256) ?? [];
      const [twin] = twins.filter(({ structure }) => structure !== own).toSorted(byTelling);
      if (!twin) return [];
      const { params, ownerParams } = tellOther(twin);
      return [
        {
          part: photoPart(photo),
          measured: photo.fileName,
          limit: null,
          margin: null,
          unit: null,
          params: { view: photo.view, ...params },
          ownerParams,
        },
      ];
    });
  },
  message: ({ measured, params, ownerParams }) => {
    const other = params['other'] ?? ownerParams['other'];
    const whose = other === undefined ? 'another structure' : `structure ${say(other, null)}`;
    const batch = params['otherBatch'] ?? ownerParams['otherBatch'];
    const where = batch === undefined ? '' : ` in batch ${say(batch, null)}`;
    return `The photograph ${say(measured, null)} (${viewWord(String(params['view']))}) was handed in for ${whose}${where} too, byte for byte.`;
  },
  remedy: () =>
    'Hand in the photograph that was taken at this structure; or place this one where it belongs.',
};

import { viewWord } from '#shared/records/photo-views.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import { photoPart } from '../photo-part.ts';
import type { FindingDraft, LineRule } from '../types.ts';

export const photoUndated: LineRule = {
  code: 'photo-undated',
  title: 'Photograph without a time',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'note',
  field: 'structureNumber',
  needs: ['photos'],
  paramsSchema: paramsSchema({}),
  check: ({ photos }) =>
    (photos ?? []).flatMap((photo): FindingDraft[] => {
      const { facts } = photo;
      if (!facts || facts.takenWall !== null || facts.takenAtMs !== null) return [];
      return [
        {
          part: photoPart(photo),
          measured: photo.fileName,
          limit: null,
          margin: null,
          unit: null,
          params: { view: photo.view },
        },
      ];
    }),
  message: ({ measured, params }) =>
    `The photograph ${say(measured, null)} (${viewWord(String(params['view']))}) does not say when it was taken.`,
  remedy: () => 'Hand in the file as the camera wrote it: messengers and editors take the time away.',
};

import { contractorWall } from '#server/http/contractor-wall.ts';
import { defineRoute, type Route } from '#server/http/define-route.ts';
import photoMatchBodySchema from '#schemas/api/photo-match-body.schema.json' with { type: 'json' };
import photoSchema from '#schemas/api/photo.schema.json' with { type: 'json' };
import type { Photo, PhotoMatchBody } from '#shared/generated/api-types.ts';
import { listPhotos, readPhoto } from './list-photos.ts';
import { placePhoto } from './place-photo.ts';
import { presentPhoto } from './present-photo.ts';
import { sendPhotoFile, type PhotoSize } from './send-photo-file.ts';

export const photoRoutes: readonly Route[] = [
  defineRoute<{ reply: { items: Photo[] } }>({
    method: 'get',
    path: '/api/batches/:id/photos',
    summary: 'Photographs of a batch and where they lie',
    permission: { action: 'read', subject: 'Photo' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: photoSchema } },
      required: ['items'],
    },
    handler: async ({ em, params, actor, ability }) => listPhotos(em, { batchId: params.id, actor, ability }),
  }),
  defineRoute<{ body: PhotoMatchBody; reply: Photo }>({
    method: 'put',
    path: '/api/photos/:id/match',
    summary: 'Place a photograph on a line by hand',
    permission: { action: 'hand-in', subject: 'Photo' },
    body: photoMatchBodySchema,
    reply: photoSchema,
    handler: async ({ em, params, body, actor, ability }) => {
      const contractorId = contractorWall(ability, 'hand-in', 'Photo');
      await placePhoto(em, { photoId: params.id, contractorId, actor, match: body });
      return presentPhoto(await readPhoto(em, { id: params.id, actor, ability }), { ability });
    },
  }),
  defineRoute<{ reply: Photo }>({
    method: 'delete',
    path: '/api/photos/:id/match',
    summary: 'Take a photograph off its line',
    permission: { action: 'hand-in', subject: 'Photo' },
    reply: photoSchema,
    handler: async ({ em, params, actor, ability }) => {
      const contractorId = contractorWall(ability, 'hand-in', 'Photo');
      await placePhoto(em, { photoId: params.id, contractorId, actor, match: null });
      return presentPhoto(await readPhoto(em, { id: params.id, actor, ability }), { ability });
    },
  }),
  defineRoute<{ query: { size?: PhotoSize } }>({
    method: 'get',
    path: '/api/photos/:id/file',
    summary: 'The picture itself',
    permission: { action: 'read', subject: 'Photo' },
    query: { size: { enum: ['thumb', 'display', 'original'] } },
    raw: true,
    produces: 'image/jpeg',
    handler: async (ctx) => sendPhotoFile(ctx),
  }),
];

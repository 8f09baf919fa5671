import { defineJob } from '#server/jobs/define-job.ts';

export type PreparePhotosPayload = { readonly batchId: string };

/** Display sizes and facts (size, capture time, position) of a batch's photographs that have none yet. */
export const preparePhotosJob = defineJob<PreparePhotosPayload>({
  name: 'prepare-photos',
  payload: {
    type: 'object',
    required: ['batchId'],
    additionalProperties: false,
    properties: { batchId: { type: 'string', format: 'uuid' } },
  },
  retryLimit: 4,
  expireSeconds: 900,
  loadParked: () => import('./park-photos.ts').then((module) => ({ parked: module.parkPhotos })),
  load: () => import('./prepare-photos.ts').then((module) => ({ handler: module.preparePhotos })),
});

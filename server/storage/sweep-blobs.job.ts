import { defineJob } from '#server/jobs/define-job.ts';

/** Once a day: blobs that nothing refers to. */
export const sweepBlobsJob = defineJob<object>({
  name: 'sweep-blobs',
  payload: { type: 'object', additionalProperties: false },
  retryLimit: 1,
  expireSeconds: 1_800,
  everySeconds: 86_400,
  load: () => import('#server/storage/sweep-blobs.ts').then((module) => ({ handler: module.sweepBlobs })),
});

import { defineJob } from '#server/jobs/define-job.ts';

/** Once a day: rows that have done their work. */
export const tidyJob = defineJob<object>({
  name: 'tidy',
  payload: { type: 'object', additionalProperties: false },
  retryLimit: 1,
  everySeconds: 86_400,
  load: () => import('#server/jobs/tidy.ts').then((module) => ({ handler: module.tidy })),
});

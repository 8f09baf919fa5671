import { defineJob } from '#server/jobs/define-job.ts';

/** Every quarter of an hour: reviews that nobody works on go back to the queue. */
export const freeIdleReviewsJob = defineJob<object>({
  name: 'free-idle-reviews',
  payload: { type: 'object', additionalProperties: false },
  retryLimit: 1,
  everySeconds: 900,
  load: () => import('./free-idle-reviews.ts').then((module) => ({ handler: module.freeIdleReviews })),
});

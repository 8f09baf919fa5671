import { defineJob } from '#server/jobs/define-job.ts';

export type CheckRevisionPayload = { readonly revisionId: string; readonly input: number };

/** Checks what was handed in up to an input; a newer input makes an older check superfluous. */
export const checkRevisionJob = defineJob<CheckRevisionPayload>({
  name: 'check-revision',
  payload: {
    type: 'object',
    required: ['revisionId', 'input'],
    additionalProperties: false,
    properties: {
      revisionId: { type: 'string', format: 'uuid' },
      input: { type: 'integer', minimum: 1 },
    },
  },
  retryLimit: 4,
  expireSeconds: 300,
  loadParked: () => import('./park-check.ts').then((module) => ({ parked: module.parkCheck })),
  load: () => import('./check-revision.ts').then((module) => ({ handler: module.checkRevision })),
});

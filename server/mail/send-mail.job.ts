import { defineJob } from '#server/jobs/define-job.ts';

/** Sends one row of the outbox. A mail server that is down for a night loses nothing: the repeats reach over about 18 hours. */
export const sendMailJob = defineJob<{ outboxId: string }>({
  name: 'send-mail',
  payload: {
    type: 'object',
    required: ['outboxId'],
    additionalProperties: false,
    properties: { outboxId: { type: 'string', format: 'uuid' } },
  },
  retryLimit: 14,
  retryDelay: 4,
  expireSeconds: 120,
  concurrency: 2,
  loadParked: () => import('#server/mail/park-mail.ts').then((module) => ({ parked: module.parkMail })),
  load: () => import('#server/mail/send-mail.ts').then((module) => ({ handler: module.sendMail })),
});

import type { JobDefinition } from '#server/jobs/define-job.ts';
import { sendMailJob } from '#server/mail/send-mail.job.ts';
import { sweepBlobsJob } from '#server/storage/sweep-blobs.job.ts';

/** Every job there is; each module adds one line. Their queues are made when the database is migrated. */
export const JOBS: readonly JobDefinition<never>[] = [sendMailJob, sweepBlobsJob];

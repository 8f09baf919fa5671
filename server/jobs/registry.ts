import type { JobDefinition } from '#server/jobs/define-job.ts';
import { tidyJob } from '#server/jobs/tidy.job.ts';
import { sendMailJob } from '#server/mail/send-mail.job.ts';
import { checkRevisionJob } from '#server/modules/check/check-revision.job.ts';
import { preparePhotosJob } from '#server/modules/photos/prepare-photos.job.ts';
import { freeIdleReviewsJob } from '#server/modules/review/free-idle-reviews.job.ts';
import { makeSheetsJob } from '#server/modules/sheets/make-sheets.job.ts';
import { issueTransmittalJob } from '#server/modules/transmittals/issue-transmittal.job.ts';
import { sweepBlobsJob } from '#server/storage/sweep-blobs.job.ts';

/** Every job there is; each module adds one line. Their queues are made when the database is migrated. */
export const JOBS: readonly JobDefinition<never>[] = [
  sendMailJob,
  sweepBlobsJob,
  tidyJob,
  checkRevisionJob,
  preparePhotosJob,
  issueTransmittalJob,
  makeSheetsJob,
  freeIdleReviewsJob,
];

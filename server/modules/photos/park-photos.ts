import { row } from '#server/db/rows.ts';
import type { ParkedHandler } from '#server/jobs/define-job.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { finishPhotos } from './finish-photos.ts';
import type { PreparePhotosPayload } from './prepare-photos.job.ts';

/** No attempt at a batch's photographs is left: those that are not prepared say so, and the check goes on without them. */
export const parkPhotos: ParkedHandler<PreparePhotosPayload> = async ({ batchId }, { em }) => {
  const batch = await row<{ number: string }>(em, 'select number from batches where id = $1', [batchId]);
  if (!batch) return;
  const problem = {
    code: 'photos.failed',
    detail:
      'The photograph is kept, but its time and place could not be read after several attempts. The check goes on without them. Tell the administrator, who sees the reason and can have it tried again.',
  };
  await finishPhotos(em, { batchId, problem });
  await appendTrail(em, {
    actor: null,
    action: 'batch.photos-failed',
    subject: { type: 'batch', id: batchId, label: batch.number },
    payload: { code: problem.code },
  });
};

import { rows, run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { appendTrailMany } from '#server/trail/append-trail-many.ts';
import { IDLE_REVIEW_DAYS } from '#shared/review/idle-review.ts';

/** A taken batch without a decision for the stated time is free for any inspector again; what was decided stands. */
export const freeIdleReviews: JobHandler<object> = async (_payload, { em }) => {
  await em.transactional(async (tx) => {
    // Batches are locked as every other writer locks them; one that somebody is working on just now is not idle.
    await rows(
      tx,
      `select b.id from batches b join revisions v on v.batch_id = b.id
       where v.status = 'in-review' and v.worked_at < now() - make_interval(days => $1)
       order by b.id for update of b skip locked`,
      [IDLE_REVIEW_DAYS],
    );
    const freed = await rows<{ batch_id: string; number: string; n: number; inspector_id: string }>(
      tx,
      `select v.batch_id, b.number, v.n, v.inspector_id from revisions v join batches b on b.id = v.batch_id
       where v.status = 'in-review' and v.worked_at < now() - make_interval(days => $1)
       order by b.id for update of v skip locked`,
      [IDLE_REVIEW_DAYS],
    );
    await run(
      tx,
      `update revisions set status = 'submitted', inspector_id = null, taken_at = null, worked_at = null, version = version + 1
       where status = 'in-review' and batch_id = any($1::uuid[])`,
      [freed.map((one) => one.batch_id)],
    );
    await appendTrailMany(
      tx,
      freed.map((one) => ({
        actor: null,
        action: 'batch.freed',
        subject: { type: 'batch', id: one.batch_id, label: one.number },
        payload: { revision: one.n, inspector: one.inspector_id, afterDays: IDLE_REVIEW_DAYS },
      })),
    );
  });
};

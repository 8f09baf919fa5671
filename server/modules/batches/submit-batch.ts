import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { conflict } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { lockRevision, stateOf, type LockedRevision } from './lock-revision.ts';
import { mailBatchReceived } from './mail-batch-received.ts';

/**
 * Hands the open revision in and freezes it: its files, its records with the versions they were checked on, its
 * findings. Tells the contractor and the inspectors.
 * @throws Problem 404; 409 while the check runs, a record is incomplete, the standard changed since the check, or something
 * came in after `seenInput`, the upload whose check the contractor looked at (null: not said)
 */
export async function submitBatch(
  em: EntityManager,
  options: { batchId: string; contractorId: string | null; actor: Actor; seenInput: number | null },
): Promise<void> {
  const { batchId, contractorId, actor, seenInput } = options;
  await em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'submit' }, actor));
    if (seenInput !== null && seenInput !== revision.input)
      throw conflict(
        'revision.newer-input',
        'Something was added to this batch since you opened it, in another window or by a colleague. What is shown now is the newest check: look at it, then submit.',
      );
    await refuseOldStandard(tx, revision);
    await run(
      tx,
      `update revisions set status = $2, submitted_at = now(), submitted_by = $3, version = version + 1 where id = $1`,
      [revision.id, moved.status, actor.id],
    );
    await run(
      tx,
      `update lines l set state = 'undecided', revision_id = r.revision_id, record_id = r.id, version = l.version + 1
       from records r where r.run_id = $1 and l.id = r.line_id`,
      [revision.run_id],
    );
    await run(tx, 'select open_findings($1)', [revision.run_id]);
    await appendTrail(tx, {
      actor,
      action: 'batch.submitted',
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: {
        revision: revision.n,
        input: revision.input,
        run: revision.run_id,
        standards: revision.counts?.standards ?? [],
        lines: revision.counts?.lines ?? 0,
        nonconformities: revision.counts?.nonconformity ?? 0,
        queries: revision.counts?.query ?? 0,
      },
    });
    await mailBatchReceived(tx, { revision, actor });
  });
}

/** What was shown before handing in must be what counts after it. A later revision keeps the versions of the first. */
async function refuseOldStandard(em: EntityManager, revision: LockedRevision): Promise<void> {
  if (revision.n > 0) return;
  const newer = await row<{ n: number }>(
    em,
    `select s.n from check_runs run
     join standard_versions s on s.state = 'published' and s.published_at > run.started_at
     where run.id = $1 and exists (
       select 1 from records r left join standard_versions used on used.id = r.standard_id
       where r.run_id = run.id and r.work_day >= s.effective_on and s.effective_on > used.effective_on
     ) limit 1`,
    [revision.run_id],
  );
  if (newer)
    throw conflict(
      'revision.standard-changed',
      `Version ${newer.n} of the standard was published after this batch was checked. Check it again, look at the findings, then submit.`,
    );
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { isRefusal } from '#shared/review/outcome.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { lockForCheck } from './lock-for-check.ts';
import type { StartedRun } from './start-run.ts';

/** For people: what happened, what it means, what to do. */
export type CheckProblem = {
  readonly code: string;
  readonly detail: string;
  readonly params?: Readonly<Record<string, unknown>>;
};

/** Ends a check without a result: the reason is kept and shown, and the revision is a draft again. */
export async function failCheck(
  em: EntityManager,
  started: Pick<StartedRun, 'revisionId' | 'input'>,
  problem: CheckProblem,
): Promise<void> {
  await em.transactional(async (tx) => {
    const revision = await lockForCheck(tx, started.revisionId);
    await run(
      tx,
      `update check_runs set state = 'failed', problem = $3, finished_at = now()
       where revision_id = $1 and input = $2 and state <> 'done'`,
      [started.revisionId, started.input, JSON.stringify(problem)],
    );
    // A newer input has its own check, which says where the revision stands.
    if (!revision || revision.input !== started.input) return;
    const moved = moveRevision(
      {
        status: revision.status,
        contractorId: revision.contractor_id,
        inspectorId: null,
        lines: 0,
        incomplete: 0,
        checkCurrent: false,
      },
      { type: 'fail-check' },
      null,
    );
    if (isRefusal(moved)) return;
    await run(tx, 'update revisions set status = $2, version = version + 1 where id = $1', [
      revision.id,
      moved.accepted.status,
    ]);
    await setProgress(tx, { subject: `check:${revision.id}`, state: 'failed', done: 0, total: 0, problem });
    await appendTrail(tx, {
      actor: null,
      action: 'batch.check-failed',
      subject: { type: 'batch', id: revision.batch_id, label: revision.batch_number },
      payload: { revision: revision.n, input: started.input, code: problem.code },
    });
  });
}

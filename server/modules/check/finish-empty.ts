import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { lockForCheck } from './lock-for-check.ts';
import type { StartedRun } from './start-run.ts';

/** Photographs came before the first workbook: there is nothing to check yet, and nothing is wrong. */
export async function finishEmpty(em: EntityManager, started: StartedRun): Promise<void> {
  await em.transactional(async (tx) => {
    const revision = await lockForCheck(tx, started.revisionId);
    await run(
      tx,
      `update check_runs set state = 'done', finished_at = now(),
         counts = '{"lines":0,"nonconformity":0,"query":0,"note":0,"incomplete":0,"standards":[]}'
       where id = $1`,
      [started.id],
    );
    if (!revision || revision.input !== started.input || revision.status !== 'checking') return;
    await run(tx, `update revisions set status = 'draft', version = version + 1 where id = $1`, [
      revision.id,
    ]);
    await setProgress(tx, { subject: `check:${revision.id}`, state: 'done', done: 0, total: 0 });
  });
}

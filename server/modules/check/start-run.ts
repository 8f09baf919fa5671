import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { setProgress } from '#server/jobs/progress.ts';
import type { CheckRevisionPayload } from './check-revision.job.ts';
import { ENGINE, RECORD_SCHEMA } from './engine.ts';
import { lockForCheck } from './lock-for-check.ts';
import { waitForPhotos } from './wait-for-photos.ts';

export type StartedRun = {
  readonly id: string;
  readonly revisionId: string;
  readonly input: number;
  readonly n: number;
  readonly batchId: string;
  readonly batchNumber: string;
  readonly contractorId: string;
  readonly workOrderId: string;
  /** When the check began: what is told as "now" to the rules. */
  readonly asOfMs: number;
};

/** Opens the run of an input, or null when there is nothing left to do: a newer input came, it was handed in, it is checked, or it waits for photographs. */
export async function startRun(em: EntityManager, payload: CheckRevisionPayload): Promise<StartedRun | null> {
  return em.transactional(async (tx) => {
    const revision = await lockForCheck(tx, payload.revisionId);
    if (!revision || revision.input !== payload.input) return null;
    if (revision.status !== 'checking' && revision.status !== 'draft') return null;
    if (await waitForPhotos(tx, payload, revision.batch_id)) return null;
    const opened = await row<{ id: string; started_at: string }>(
      tx,
      `insert into check_runs (revision_id, input, engine, schema, state, as_of, started_at)
       values ($1, $2, $3, $4, 'running', now(), now())
       on conflict (revision_id, input, engine) do update
       set state = 'running', problem = null, as_of = now(), started_at = now(), finished_at = null
       where check_runs.state <> 'done'
       returning id, started_at`,
      [revision.id, payload.input, ENGINE, RECORD_SCHEMA],
    );
    if (!opened) return null;
    // A failed check that is tried again, by an administrator say.
    if (revision.status === 'draft')
      await run(tx, `update revisions set status = 'checking', version = version + 1 where id = $1`, [
        revision.id,
      ]);
    await setProgress(tx, { subject: `check:${revision.id}`, state: 'running', done: 0, total: 0 });
    return {
      id: opened.id,
      revisionId: revision.id,
      input: payload.input,
      n: revision.n,
      batchId: revision.batch_id,
      batchNumber: revision.batch_number,
      contractorId: revision.contractor_id,
      workOrderId: revision.work_order_id,
      asOfMs: Date.parse(opened.started_at),
    };
  });
}

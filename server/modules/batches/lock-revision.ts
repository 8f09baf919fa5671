import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { RevisionState } from '#shared/review/revision.ts';
import type { RevisionStatus } from '#shared/review/states.ts';
import { revisionState } from './batch-can.ts';
import type { RunCounts } from './batch-select.ts';

export type LockedRevision = {
  id: string;
  batch_id: string;
  batch_number: string;
  work_order_id: string;
  contractor_id: string;
  n: number;
  status: RevisionStatus;
  inspector_id: string | null;
  input: number;
  run_id: string | null;
  run_input: number | null;
  counts: RunCounts | null;
  version: number;
};

/**
 * The newest revision of a batch, its row locked until the transaction ends: who decides on it next sees what this one wrote.
 * @throws Problem 404 for another contractor's batch as for none
 */
export async function lockRevision(
  em: EntityManager,
  batch: { id: string; contractorId: string | null },
): Promise<LockedRevision> {
  // Locked by id first: a lock taken while sorting could fall on a revision that is no longer the newest.
  const owned = await row<{ id: string }>(
    em,
    'select id from batches where id = $1 and ($2::uuid is null or contractor_id = $2) for update',
    [batch.id, batch.contractorId],
  );
  if (!owned) throw notFound();
  const found = await row<LockedRevision>(
    em,
    `select v.id, v.batch_id, b.number as batch_number, b.work_order_id, b.contractor_id, v.n, v.status, v.inspector_id,
       v.input, v.run_id, run.input as run_input, run.counts, v.version
     from revisions v join batches b on b.id = v.batch_id left join check_runs run on run.id = v.run_id
     where v.batch_id = $1 order by v.n desc limit 1 for update of v`,
    [batch.id],
  );
  if (!found) throw notFound();
  return found;
}

/** What the state machine wants to know of it. */
export const stateOf = (revision: LockedRevision): RevisionState => revisionState(revision);

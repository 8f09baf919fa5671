import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { RevisionStatus } from '#shared/review/states.ts';

export type ShownRevision = {
  id: string;
  batch_id: string;
  n: number;
  status: RevisionStatus;
  run_id: string;
  contractor_id: string;
  inspector_id: string | null;
};

/**
 * The revision whose lines a person sees on a batch: the newest that was checked, or the one asked for. The owner's
 * people see only what was handed in. Null: nothing to see yet.
 * @throws Problem 404 for another contractor's batch as for none
 */
export async function shownRevision(
  em: EntityManager,
  asked: { batchId: string; contractorId: string | null; actor: Actor; revision?: number | undefined },
): Promise<ShownRevision | null> {
  const batch = await row<{ id: string }>(
    em,
    'select id from batches where id = $1 and ($2::uuid is null or contractor_id = $2)',
    [asked.batchId, asked.contractorId],
  );
  if (!batch) throw notFound();
  return row<ShownRevision>(
    em,
    `select v.id, v.batch_id, v.n, v.status, v.run_id, b.contractor_id, v.inspector_id
     from revisions v join batches b on b.id = v.batch_id
     where v.batch_id = $1 and v.run_id is not null
       and ($2::boolean or v.status not in ('draft', 'checking', 'checked'))
       and ($3::int is null or v.n = $3)
     order by v.n desc limit 1`,
    [asked.batchId, asked.actor.orgKind === 'contractor', asked.revision ?? null],
  );
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import type { RevisionStatus } from '#shared/review/states.ts';

export type RevisionToCheck = {
  id: string;
  n: number;
  status: RevisionStatus;
  input: number;
  batch_id: string;
  batch_number: string;
  contractor_id: string;
  work_order_id: string;
};

/** The revision with its batch locked first, as every use case locks them. Null: there is none. */
export async function lockForCheck(em: EntityManager, revisionId: string): Promise<RevisionToCheck | null> {
  await row(
    em,
    'select b.id from batches b join revisions v on v.batch_id = b.id where v.id = $1 for update of b',
    [revisionId],
  );
  return row<RevisionToCheck>(
    em,
    `select v.id, v.n, v.status, v.input, v.batch_id, b.number as batch_number, b.contractor_id, b.work_order_id
     from revisions v join batches b on b.id = v.batch_id where v.id = $1 for update of v`,
    [revisionId],
  );
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';

export type LockedRecord = {
  id: string;
  line_id: string;
  line_state: LineState;
  /** The record that the line's state speaks of; an older revision's record is decided no more. */
  current: boolean;
  structure_number: string;
  /** Number of decisions on the record itself: its version for If-Match. */
  version: number;
  revision_id: string;
  revision_n: number;
  revision_status: RevisionStatus;
  inspector_id: string | null;
  batch_id: string;
  batch_number: string;
  contractor_id: string;
  work_order_id: string;
  /** Nonconformities and queries that are not decided yet. */
  open_findings: number;
};

/**
 * A submitted record, its batch locked until the transaction ends.
 * @throws Problem 404 for one that is not submitted as for none
 */
export async function lockRecord(em: EntityManager, id: string): Promise<LockedRecord> {
  const batch = await row<{ id: string }>(
    em,
    `select b.id from batches b join revisions v on v.batch_id = b.id join records r on r.revision_id = v.id
     where r.id = $1 for update of b`,
    [id],
  );
  if (!batch) throw notFound();
  const found = await row<LockedRecord>(
    em,
    `select r.id, r.line_id, l.state as line_state, l.record_id = r.id as current, r.structure_number,
       coalesce((select max(d.seq) from decisions d where d.record_id = r.id), 0) as version,
       v.id as revision_id, v.n as revision_n, v.status as revision_status, v.inspector_id,
       b.id as batch_id, b.number as batch_number, b.contractor_id, r.work_order_id,
       (select count(*)::int from finding_states s
         where s.record_id = r.id and s.severity <> 'note' and s.state = 'open') as open_findings
     from records r
     join lines l on l.id = r.line_id
     join revisions v on v.id = r.revision_id
     join batches b on b.id = v.batch_id
     where r.id = $1 and v.run_id = r.run_id and v.submitted_at is not null`,
    [id],
  );
  if (!found) throw notFound();
  return found;
}

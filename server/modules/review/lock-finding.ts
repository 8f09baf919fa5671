import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import type { Severity } from '#shared/findings/types.ts';
import type { FindingState } from '#shared/review/finding-decision.ts';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';

export type LockedFinding = {
  id: string;
  record_id: string | null;
  line_id: string | null;
  line_state: LineState | null;
  code: string;
  severity: Severity;
  structure_number: string | null;
  state: FindingState;
  answered: boolean;
  version: number;
  revision_id: string;
  revision_n: number;
  revision_status: RevisionStatus;
  inspector_id: string | null;
  batch_id: string;
  batch_number: string;
  contractor_id: string;
  work_order_id: string;
};

/** Words of the API for the states that the projection keeps. */
export const FINDING_STATE_SQL = `case s.state when 'open' then 'undecided' when 'held' then 'concession-asked' else s.state end`;

/**
 * A submitted finding, its batch locked until the transaction ends, so that two decisions on one batch follow one another.
 * @throws Problem 404 for a finding that is not submitted as for none
 */
export async function lockFinding(em: EntityManager, id: string): Promise<LockedFinding> {
  const batch = await row<{ id: string }>(
    em,
    'select b.id from batches b join finding_states s on s.batch_id = b.id where s.finding_id = $1 for update of b',
    [id],
  );
  if (!batch) throw notFound();
  const found = await row<LockedFinding>(
    em,
    `select f.id, f.record_id, f.line_id, l.state as line_state, f.code, f.severity, f.structure_number,
       ${FINDING_STATE_SQL} as state, s.version,
       exists (select 1 from answers a where a.revision_id = f.revision_id and a.fingerprint = f.fingerprint) as answered,
       v.id as revision_id, v.n as revision_n, v.status as revision_status, v.inspector_id,
       b.id as batch_id, b.number as batch_number, b.contractor_id, b.work_order_id
     from finding_states s
     join findings f on f.id = s.finding_id
     join revisions v on v.id = s.revision_id
     join batches b on b.id = s.batch_id
     left join lines l on l.id = s.line_id
     where s.finding_id = $1`,
    [id],
  );
  if (!found) throw notFound();
  return found;
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { rows, run } from '#server/db/rows.ts';
import type { Severity } from '#shared/findings/types.ts';
import type { FindingState } from '#shared/review/finding-decision.ts';
import { lineState } from '#shared/review/line-state.ts';
import type { LineState } from '#shared/review/states.ts';
import { FINDING_STATE_SQL } from './lock-finding.ts';

type LineFactsRow = {
  id: string;
  record_id: string;
  revision_id: string;
  state: LineState;
  decision: 'approve' | 'return' | null;
  findings: { severity: Severity; state: FindingState }[];
};
export type ChangedLine = {
  id: string;
  recordId: string;
  revisionId: string;
  before: LineState;
  state: LineState;
};

/** Works out the state of these lines from their findings and decisions and keeps it; gives back what each is now. */
export async function refreshLineStates(
  em: EntityManager,
  lineIds: readonly string[],
): Promise<ChangedLine[]> {
  const lines = await rows<LineFactsRow>(
    em,
    `select l.id, l.record_id, l.revision_id, l.state,
       case last.decision when 'approve' then 'approve' when 'return' then 'return' end as decision,
       coalesce((
         select jsonb_agg(jsonb_build_object('severity', s.severity, 'state', ${FINDING_STATE_SQL}))
         from finding_states s where s.record_id = l.record_id
       ), '[]') as findings
     from lines l
     left join lateral (
       select d.decision from decisions d where d.record_id = l.record_id order by d.seq desc limit 1
     ) last on true
     where l.id = any($1::uuid[]) and l.record_id is not null and l.state not in ('on-record', 'abandoned')
     for update of l`,
    [lineIds],
  );
  const changed = lines.map((line) => ({
    id: line.id,
    recordId: line.record_id,
    revisionId: line.revision_id,
    before: line.state,
    state: lineState(line),
  }));
  await run(
    em,
    `update lines l set state = n.state, version = l.version + 1
     from jsonb_to_recordset($1::jsonb) as n(id uuid, state text) where l.id = n.id and l.state <> n.state`,
    [JSON.stringify(changed.map(({ id, state }) => ({ id, state })))],
  );
  return changed;
}

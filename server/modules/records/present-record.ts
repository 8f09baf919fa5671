import type { RecordRow } from '#shared/generated/api-types.ts';
import { may, type Ability, type Actor } from '#shared/permissions/ability.ts';
import type { RecordDbRow } from './record-select.ts';

/** A line on the wire. While it is under review a contractor is told nothing of the decisions yet. */
export function presentRecord(row: RecordDbRow, viewer: { actor: Actor; ability: Ability }): RecordRow {
  const told = viewer.actor.orgKind === 'owner' || row.revision_status !== 'in-review';
  const counts = { nonconformity: row.nonconformities, query: row.queries, note: row.notes };
  return {
    id: row.id,
    lineId: row.line_id,
    kind: row.kind,
    structureNumber: row.structure_number,
    occurrence: row.occurrence,
    sheet: row.sheet,
    row: row.row,
    state: told ? row.state : 'undecided',
    values: { ...row.values },
    derived: { ...row.derived },
    photos: row.photos,
    counts: { ...counts, undecided: told ? row.undecided : counts.nonconformity + counts.query },
    standard: row.standard ?? 0,
    workDay: row.work_day,
    decision: told ? decisionOf(row) : null,
    version: row.version,
    can: recordCan(row, viewer),
  };
}

function decisionOf(row: RecordDbRow): RecordRow['decision'] {
  const { decision } = row;
  if ((decision !== 'approve' && decision !== 'return') || row.decision_at === null) return null;
  return { decision, reason: row.decision_reason, by: row.decision_by ?? '', at: row.decision_at };
}

function recordCan(row: RecordDbRow, { actor, ability }: { actor: Actor; ability: Ability }): string[] {
  const owned = { contractorId: row.contractor_id };
  const can: string[] = [];
  const closed = row.revision_status === 'decided' || row.revision_status === 'on-record';
  if (may(ability, 'review', 'Record', owned)) {
    const holds = row.revision_status === 'in-review' && row.inspector_id === actor.id;
    if (holds || (row.revision_status === 'decided' && row.state === 'undecided')) can.push('decide');
    if (closed && row.state === 'approved') can.push('reopen');
  }
  if (closed && row.state === 'returned' && may(ability, 'assign', 'Record', owned)) can.push('abandon');
  if (closed && row.state === 'approved' && may(ability, 'enter', 'RegisterEntry', owned))
    can.push('enter', 'refer-back');
  return can;
}

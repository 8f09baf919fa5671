import { renderFinding } from '#shared/findings/render.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { may, type Ability, type Actor } from '#shared/permissions/ability.ts';
import { toFinding } from './finding-facts.ts';
import type { FindingDbRow } from './finding-select.ts';
import { decisionOf, FINDING_STATES } from './finding-standing.ts';

/**
 * A finding on the wire, with its sentence. A contractor is told nothing of another one, and nothing of a review that
 * is still going on: decisions count when it is closed.
 */
export function presentFinding(row: FindingDbRow, viewer: { actor: Actor; ability: Ability }): FindingRow {
  const owner = viewer.actor.orgKind === 'owner';
  const told = owner || row.revision_status !== 'in-review';
  const { title, message, remedy } = renderFinding(toFinding(row, owner));
  return {
    id: row.id,
    recordId: row.record_id,
    lineId: row.line_id,
    kind: row.kind,
    code: row.code,
    title,
    severity: row.severity,
    structureNumber: row.structure_number,
    sheet: row.sheet,
    row: row.row,
    cell: row.cell,
    field: row.field,
    measured: row.measured,
    limit: row.limit_value,
    margin: row.margin,
    unit: row.unit,
    uncertainty: row.uncertainty,
    params: { ...row.params, ...(owner ? row.owner_params : {}) },
    message,
    remedy,
    answer: answerOf(row, owner),
    state: told ? FINDING_STATES[row.state] : 'undecided',
    decision: told ? decisionOf(row) : null,
    concession: told ? concessionOf(row) : null,
    version: row.version,
    can: findingCan(row, viewer),
  };
}

function answerOf(row: FindingDbRow, owner: boolean): FindingRow['answer'] {
  if (row.answer_text === null || row.answer_at === null || (owner && row.answer_open)) return null;
  return { text: row.answer_text, by: row.answer_by ?? '', at: row.answer_at };
}

function concessionOf(row: FindingDbRow): FindingRow['concession'] {
  const { concession_id: id, concession_number: number, concession_type: state } = row;
  if (!id || !number || !state || state === 'withdrawn') return null;
  return { id, number, state };
}

function findingCan(row: FindingDbRow, { actor, ability }: { actor: Actor; ability: Ability }): string[] {
  const owned = { contractorId: row.contractor_id };
  const can: string[] = [];
  if (row.severity === 'note') return can;
  // No answer makes a record complete: it is not taken until the workbook is.
  const answerable = row.severity === 'query' || !row.code.startsWith('record-');
  if (answerable && row.open_revision_id && may(ability, 'hand-in', 'Finding', owned)) can.push('answer');
  const holds = row.revision_status === 'in-review' && row.inspector_id === actor.id;
  // A line reopened after the review closed is decided by any inspector.
  const reopened = row.revision_status === 'decided' && row.line_state === 'undecided';
  if (!(holds || reopened) || !may(ability, 'review', 'Finding', owned)) return can;
  if (row.state !== 'held') can.push('decide', 'ask-concession');
  if (row.state !== 'open') can.push('undo');
  return can;
}

import { toFinding } from '#server/modules/records/finding-facts.ts';
import { renderFinding } from '#shared/findings/render.ts';
import type { Concession } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import type { ConcessionDbRow, ConcessionFindingRow } from './concession-select.ts';

/** A concession on the wire. */
export function presentConcession(
  row: ConcessionDbRow,
  viewer: { actor: Actor; ability: Ability },
): Concession {
  const answered = row.state === 'granted' || row.state === 'refused';
  return {
    id: row.id,
    number: row.number,
    state: row.state,
    findings: row.findings.map(presentFinding),
    batch: { id: row.batch_id, number: row.batch_number },
    contractor: { id: row.contractor_id, name: row.contractor_name },
    askedReason: row.reason,
    askedBy: row.asked_by,
    askedAt: row.at,
    reason: answered ? row.decision_reason : null,
    condition: row.condition,
    endsOn: row.ends_on,
    answeredBy: answered ? row.decided_by : null,
    answeredAt: answered ? row.decided_at : null,
    version: row.version,
    can: row.state === 'asked' && viewer.ability.can('concede', 'Concession') ? ['decide'] : [],
  };
}

/** Nothing that a rule learnt about another contractor: a contractor reads this too. */
function presentFinding(row: ConcessionFindingRow): Concession['findings'][number] {
  const finding = toFinding(row, false);
  const { title, message } = renderFinding(finding);
  const { structureNumber, measured, limit, margin, unit, uncertainty } = finding;
  return {
    id: row.id,
    recordId: row.record_id,
    structureNumber,
    title,
    message,
    measured,
    limit,
    margin,
    unit,
    uncertainty,
  };
}

import { toFinding } from '#server/modules/records/finding-facts.ts';
import { decisionOf, FINDING_STATES } from '#server/modules/records/finding-standing.ts';
import { renderFinding } from '#shared/findings/render.ts';
import type { Nonconformity } from '#shared/generated/api-types.ts';
import type { NonconformityDbRow } from './nonconformity-select.ts';

/** A finding as the auditor sees it. Only the owner's people and auditors come here, so nothing is held back. */
export function presentNonconformity(row: NonconformityDbRow): Nonconformity {
  const { title, message, remedy } = renderFinding(toFinding(row, true));
  return {
    id: row.id,
    recordId: row.record_id,
    lineId: row.line_id,
    code: row.code,
    title,
    severity: row.severity,
    structureNumber: row.structure_number,
    kind: row.kind,
    sheet: row.sheet,
    row: row.row,
    cell: row.cell,
    field: row.field,
    measured: row.measured,
    limit: row.limit_value,
    margin: row.margin,
    unit: row.unit,
    uncertainty: row.uncertainty,
    params: { ...row.params, ...row.owner_params },
    message,
    remedy,
    state: FINDING_STATES[row.state],
    decision: decisionOf(row),
    grounds: row.grounds,
    action: row.action,
    dueOn: row.due_on,
    concession: row.concession,
    condition: row.condition,
    contractor: { id: row.contractor_id, name: row.contractor_name },
    workOrder: { id: row.work_order_id, number: row.work_order_number },
    batch: { id: row.batch_id, number: row.batch_number, revision: row.revision },
    installedOn: row.work_day,
    lots: row.lots,
    decidedBy: row.decided_by,
    recordNumber: row.record_number,
    version: row.version,
  };
}

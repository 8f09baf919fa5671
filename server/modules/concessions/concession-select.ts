import type { Params, Severity } from '#shared/findings/types.ts';
import type { Kind } from '#shared/records/types.ts';

export type ConcessionFindingRow = {
  id: string;
  recordId: string | null;
  structureNumber: string | null;
  code: string;
  severity: Severity;
  kind: Kind | null;
  sheet: string | null;
  row: number | null;
  cell: string | null;
  field: string | null;
  measured: number | string | null;
  limit: number | string | null;
  margin: number | null;
  unit: string | null;
  uncertainty: number | null;
  params: Params;
};

export type ConcessionDbRow = {
  id: string;
  number: string;
  state: 'asked' | 'granted' | 'refused' | 'withdrawn';
  version: number;
  at: string;
  reason: string;
  asked_by: string;
  decision_reason: string | null;
  condition: string | null;
  ends_on: string | null;
  decided_by: string | null;
  decided_at: string | null;
  contractor_id: string;
  contractor_name: string;
  batch_id: string;
  batch_number: string;
  findings: ConcessionFindingRow[];
};

export const CONCESSION_SELECT = `
select c.id, c.number, c.state, c.version, c.at, c.reason, coalesce(asked.name, '') as asked_by,
  c.decision_reason, c.condition, c.ends_on, decided.name as decided_by, c.decided_at,
  c.contractor_id, o.name as contractor_name, b.id as batch_id, b.number as batch_number,
  (
    select coalesce(jsonb_agg(jsonb_build_object(
      'id', f.id, 'recordId', f.record_id, 'structureNumber', f.structure_number, 'code', f.code, 'severity', f.severity,
      'kind', f.kind, 'sheet', f.sheet, 'row', f.row, 'cell', f.cell, 'field', f.field, 'measured', f.measured,
      'limit', f.limit_value, 'margin', f.margin, 'unit', f.unit, 'uncertainty', f.uncertainty, 'params', f.params
    ) order by f.ordinal), '[]')
    from concession_findings k join findings f on f.id = k.finding_id where k.concession_id = c.id
  ) as findings
from concession_current c
join organisations o on o.id = c.contractor_id
join revisions v on v.id = c.revision_id
join batches b on b.id = v.batch_id
left join users asked on asked.id = c.asked_by
left join users decided on decided.id = c.decided_by`;

import type { Finding, Params, Severity } from '#shared/findings/types.ts';
import type { Kind } from '#shared/records/types.ts';

/** What a stored finding says of itself, as its row has it. */
export type FindingFacts = {
  code: string;
  severity: Severity;
  kind: Kind | null;
  structure_number: string | null;
  occurrence: number | null;
  sheet: string | null;
  row: number | null;
  cell: string | null;
  field: string | null;
  measured: number | string | null;
  limit_value: number | string | null;
  margin: number | null;
  unit: string | null;
  uncertainty: number | null;
  params: Params;
  owner_params: Params;
  fingerprint: string;
};

/** Its columns, of `findings f`. */
export const FINDING_FACTS = `f.code, f.severity, f.kind, f.structure_number, f.occurrence, f.sheet, f.row, f.cell, f.field,
  f.measured, f.limit_value, f.margin, f.unit, f.uncertainty, f.params, f.owner_params, f.fingerprint`;

/** The finding as the pure code has it; without `owner` nothing that a rule learnt about another contractor. */
export function toFinding(row: FindingFacts, owner: boolean): Finding {
  return {
    code: row.code,
    severity: row.severity,
    kind: row.kind,
    structureNumber: row.structure_number,
    occurrence: row.occurrence,
    sheet: row.sheet,
    row: row.row,
    cell: row.cell,
    field: row.field,
    measured: row.measured,
    limit: row.limit_value,
    margin: row.margin,
    unit: row.unit,
    uncertainty: row.uncertainty,
    params: row.params,
    ownerParams: owner ? row.owner_params : {},
    fingerprint: row.fingerprint,
  };
}

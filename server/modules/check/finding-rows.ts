import type { Finding } from '#shared/findings/types.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { StartedRun } from './start-run.ts';

/** Rows of `findings` of a check in its order, keys as the columns. */
export function findingRows(options: {
  started: StartedRun;
  findings: readonly Finding[];
  recordIds: ReadonlyMap<string, string>;
  lineIds: ReadonlyMap<string, string>;
}): Record<string, unknown>[] {
  const { started, findings, recordIds, lineIds } = options;
  return findings.map((finding, index) => {
    const key =
      finding.kind === null ? null : lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1);
    const recordId = key === null ? null : (recordIds.get(key) ?? null);
    return {
      run_id: started.id,
      revision_id: started.revisionId,
      record_id: recordId,
      line_id: recordId === null || key === null ? null : (lineIds.get(key) ?? null),
      ordinal: index + 1,
      code: finding.code,
      severity: finding.severity,
      kind: finding.kind,
      structure_number: finding.structureNumber,
      occurrence: finding.occurrence,
      sheet: finding.sheet,
      row: finding.row,
      cell: finding.cell,
      field: finding.field,
      measured: finding.measured,
      limit_value: finding.limit,
      margin: finding.margin,
      unit: finding.unit,
      uncertainty: finding.uncertainty,
      params: finding.params,
      owner_params: finding.ownerParams,
      fingerprint: finding.fingerprint,
    };
  });
}

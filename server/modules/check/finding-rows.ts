import type { Finding } from '#shared/findings/types.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { StartedRun } from './start-run.ts';
import { storableJson } from './storable-json.ts';

/** Rows of `findings` of a check in its order, keys as the columns. */
export function findingRows(options: {
  started: StartedRun;
  findings: readonly Finding[];
  idByKey: ReadonlyMap<string, string>;
  lineIds: ReadonlyMap<string, string>;
}): Record<string, unknown>[] {
  const { started, findings, idByKey, lineIds } = options;
  return findings.map((finding, index) => {
    const key =
      finding.kind === null ? null : lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1);
    const recordId = key === null ? null : (idByKey.get(key) ?? null);
    return {
      run_id: started.id,
      revision_id: started.revisionId,
      record_id: recordId,
      line_id: recordId === null || key === null ? null : (lineIds.get(key) ?? null),
      ordinal: index + 1,
      code: finding.code,
      severity: finding.severity,
      kind: finding.kind,
      structure_number: storableJson(finding.structureNumber),
      occurrence: finding.occurrence,
      sheet: storableJson(finding.sheet),
      row: finding.row,
      cell: finding.cell,
      field: finding.field,
      measured: storableJson(finding.measured),
      limit_value: storableJson(finding.limit),
      margin: finding.margin,
      unit: finding.unit,
      uncertainty: finding.uncertainty,
      params: storableJson(finding.params),
      owner_params: storableJson(finding.ownerParams),
      fingerprint: finding.fingerprint,
    };
  });
}

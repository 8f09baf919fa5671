import { severityOrder } from '#shared/findings/severity-order.ts';
import type { Finding } from '#shared/findings/types.ts';
import { byText } from '#shared/records/canonical.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import { KINDS } from '#shared/records/types.ts';
import type { CheckedRecord } from './types.ts';

/** As the workbook has them: by sheet, then row. */
export const orderRecords = (records: readonly CheckedRecord[]): readonly CheckedRecord[] =>
  records.toSorted((a, b) => KINDS.indexOf(a.kind) - KINDS.indexOf(b.kind) || a.row - b.row);

/** Line by line in the order of the records, the gravest first; what belongs to no line comes last. */
export const orderFindings = (
  findings: readonly Finding[],
  records: readonly CheckedRecord[],
): readonly Finding[] => {
  const at = new Map(
    records.map((record, index) => [lineKey(record.kind, record.structureNumber, record.occurrence), index]),
  );
  const placeOf = (finding: Finding): number =>
    finding.kind === null
      ? records.length
      : (at.get(lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1)) ?? records.length);
  const places = new Map(findings.map((finding) => [finding, placeOf(finding)]));
  return findings.toSorted(
    (a, b) =>
      (places.get(a) ?? 0) - (places.get(b) ?? 0) ||
      severityOrder(a.severity, b.severity) ||
      byText(a.fingerprint, b.fingerprint),
  );
};

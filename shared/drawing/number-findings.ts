import type { FindingRow } from '#shared/generated/api-types.ts';
import type { SheetFinding } from './sheet-types.ts';

const ORDER = { nonconformity: 0, query: 1, note: 2 } as const;

/** The order of list and balloons: what does not conform, then queries, then notes; else as the check found them. */
export function inOrder(findings: readonly FindingRow[]): readonly FindingRow[] {
  return findings.toSorted((a, b) => ORDER[a.severity] - ORDER[b.severity]);
}

/** Findings with the number of their balloon, which is their place in the list. */
export function sheetFindings(findings: readonly FindingRow[]): readonly SheetFinding[] {
  return inOrder(findings)
    .filter((finding) => finding.severity !== 'note')
    .map((finding, index) => ({
      id: finding.id,
      number: index + 1,
      code: finding.code,
      title: finding.title,
      severity: finding.severity,
      field: finding.field,
      measured: finding.measured,
      limit: finding.limit,
      margin: finding.margin,
      unit: finding.unit,
      uncertainty: finding.uncertainty,
      settled: finding.state === 'approved',
    }));
}

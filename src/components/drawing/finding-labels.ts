import { findingText } from './finding-text.ts';
import type { ColumnLabel } from './label-column.ts';
import { missingName } from './missing-name.ts';
import { toneOf, type SheetFinding } from './sheet-types.ts';

export function findingLabels(findings: readonly SheetFinding[], metric: boolean): ColumnLabel[] {
  return findings.map((finding) => ({
    id: `finding ${finding.id}`,
    title: finding.title,
    detail: findingText(finding, metric),
    tone: toneOf(finding),
    finding,
  }));
}

/** What the drawing lacks, unless a finding says so already. */
export function missingLabels(fields: readonly string[], findings: readonly SheetFinding[]): ColumnLabel[] {
  return fields
    .filter((field) => !findings.some((finding) => finding.field === field))
    .map((field) => ({
      id: `missing ${field}`,
      title: `${missingName(field)} not given`,
      detail: 'so it is not drawn',
      tone: 'query',
      finding: null,
    }));
}

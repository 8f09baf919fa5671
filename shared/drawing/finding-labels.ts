import type { FieldValues } from '#shared/records/types.ts';
import { viewWord } from '#shared/records/view-word.ts';
import { findingText } from './finding-text.ts';
import type { ColumnLabel } from './label-column.ts';
import { missingTitle } from './missing-name.ts';
import { toneOf, type SheetFinding } from './sheet-types.ts';

export function findingLabels(findings: readonly SheetFinding[], metric: boolean): ColumnLabel[] {
  return findings.map((finding) => ({
    id: `finding ${finding.id}`,
    title: finding.title,
    detail: findingText(finding, metric) || viewOf(finding),
    tone: toneOf(finding),
    finding,
  }));
}

/** Which photograph is missing; its rule has the view for a limit. */
function viewOf({ code, limit }: SheetFinding): string {
  return code === 'photo-missing' && typeof limit === 'string' ? viewWord(limit).toLowerCase() : '';
}

/** What the drawing lacks, unless a finding says so already. `dashed`: a dashed outline stands in its place. */
export function missingLabels(
  fields: readonly string[],
  {
    findings,
    values,
    dashed,
  }: {
    readonly findings: readonly SheetFinding[];
    readonly values: FieldValues;
    readonly dashed: (field: string) => boolean;
  },
): ColumnLabel[] {
  return fields
    .filter((field) => !findings.some((finding) => finding.field === field))
    .map((field) => ({
      id: `missing ${field}`,
      title: missingTitle(field, values),
      detail: dashed(field) ? 'dashed: a sign, not a size' : 'so it is not drawn',
      tone: 'query',
      finding: null,
    }));
}

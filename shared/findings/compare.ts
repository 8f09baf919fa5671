import type { CheckResult } from '#shared/check/types.ts';
import type { Kind, Scalar } from '#shared/records/types.ts';
import { compareValues } from './compare-values.ts';
import type { Finding } from './types.ts';

/** A value of a line, or of one of its pours, that another workbook says differently. Absent before or after: null. */
export type ValueChange = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
  readonly field: string;
  /** `pour 2, row 1` for a pour's value; null for the line's own. */
  readonly part: string | null;
  readonly before: Scalar;
  readonly after: Scalar;
  /** Where it stands now; where it stood when it is gone. */
  readonly sheet: string;
  readonly cell: string | null;
};

export type CheckChanges = {
  readonly values: readonly ValueChange[];
  readonly findings: {
    readonly gone: readonly Finding[];
    readonly fresh: readonly Finding[];
    /** The same fact with another measured value, limit or severity. */
    readonly changed: readonly { readonly before: Finding; readonly after: Finding }[];
  };
};

const differs = (before: Finding, after: Finding): boolean =>
  before.measured !== after.measured || before.limit !== after.limit || before.severity !== after.severity;

/** What changed between two checks of one batch: findings by fingerprint, values by line and field. */
export const compareChecks = (before: CheckResult, after: CheckResult): CheckChanges => {
  const old = new Map(before.findings.map((finding) => [finding.fingerprint, finding]));
  const now = new Map(after.findings.map((finding) => [finding.fingerprint, finding]));
  const changed = after.findings.flatMap((finding) => {
    const earlier = old.get(finding.fingerprint);
    return earlier && differs(earlier, finding) ? [{ before: earlier, after: finding }] : [];
  });
  return {
    values: compareValues(before.records, after.records),
    findings: {
      gone: before.findings.filter((finding) => !now.has(finding.fingerprint)),
      fresh: after.findings.filter((finding) => !old.has(finding.fingerprint)),
      changed,
    },
  };
};

import type { Finding } from '#shared/findings/types.ts';
import type { Derived, FieldValues, Kind, SourceRow } from '#shared/records/types.ts';
import type { Pour } from '#shared/rules/types.ts';

/** One line as the check leaves it; stored in `records`, shown everywhere. */
export type CheckedRecord = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
  readonly sheet: string;
  readonly row: number;
  readonly source: SourceRow;
  readonly values: FieldValues;
  readonly derived: Derived;
  readonly workDay: string | null;
  readonly standardId: string;
  readonly standardNumber: number;
  /** Version of the product in force on the work day; null when no pour's product is known. */
  readonly product: { readonly code: string; readonly n: number } | null;
  readonly pours: readonly Pour[];
  /** Rows of the Events sheet, values cleaned; ascending by event. */
  readonly events: readonly SourceRow[];
  /** Codes of the findings on this line, sorted. */
  readonly ruleCodes: readonly string[];
};

/** A rule (or a part of a rule's context) that did not run, and why. */
export type Skipped = {
  readonly code: string;
  readonly reason:
    | 'off'
    | 'no-time'
    | 'no-lots'
    | 'no-lot-use'
    | 'no-design'
    | 'no-register'
    | 'no-area'
    | 'no-photos'
    | 'no-siblings'
    | 'no-earlier-check'
    /** It ran on the contractor's own records only. */
    | 'own-only';
  /** Numbers of the standards that have it off, where others that were used have it on. */
  readonly standards?: readonly number[];
};

export type CheckResult = {
  readonly records: readonly CheckedRecord[];
  readonly findings: readonly Finding[];
  readonly skipped: readonly Skipped[];
};

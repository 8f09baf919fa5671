import type { Kind, Scalar } from '#shared/records/types.ts';

export const SEVERITIES = ['nonconformity', 'query', 'note'] as const;
export type Severity = (typeof SEVERITIES)[number];

export type Params = Readonly<Record<string, Scalar | readonly Scalar[]>>;

/** A rule that a line did not meet, as data: code + parameters. Wording is rendered by shared/findings/render. */
export type Finding = {
  readonly code: string;
  readonly severity: Severity;
  /** Null: the finding belongs to the revision (an orphan pour, the Batch sheet). */
  readonly kind: Kind | null;
  /** As written in the row, also where the row belongs to no line. */
  readonly structureNumber: string | null;
  /** 1 for the first line of this structure and kind in the batch. */
  readonly occurrence: number | null;
  readonly sheet: string | null;
  readonly row: number | null;
  /** Address in the sheet, like `H9`. */
  readonly cell: string | null;
  /** Field key of the primary cell; where a balloon points on the drawing. */
  readonly field: string | null;
  readonly measured: number | string | null;
  readonly limit: number | string | null;
  /** Measured against limit, signed so that negative fails. */
  readonly margin: number | null;
  readonly unit: string | null;
  /** Expanded uncertainty (k = 2) in `unit`, where known. */
  readonly uncertainty: number | null;
  readonly params: Params;
  /** Never sent to a contractor (what a rule learnt about another one). */
  readonly ownerParams: Params;
  /** Stable over re-checks of the same fact: code, kind, structure, occurrence, field and what tells two apart. */
  readonly fingerprint: string;
};

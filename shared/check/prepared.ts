import type { CleanRow } from '#shared/records/clean-row.ts';
import type { RecordIssue } from '#shared/records/record-issue.ts';
import type { Kind } from '#shared/records/types.ts';
import type { LineEvent, Pour } from '#shared/rules/types.ts';

/** A line with the rows of other sheets that belong to it, before anything is derived. */
export type PreparedLine = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
  readonly row: CleanRow;
  readonly broken: ReadonlySet<string>;
  readonly pours: readonly Pour[];
  readonly events: readonly LineEvent[];
};

/** An issue with the row it stands in, and the line that the row belongs to. */
export type PlacedIssue = {
  readonly issue: RecordIssue;
  readonly row: CleanRow;
  readonly line: PreparedLine | null;
  /** Tells rows of one line apart, from their content. */
  readonly part: string;
};

export type Prepared = {
  readonly batch: CleanRow;
  readonly lines: readonly PreparedLine[];
  readonly pours: readonly Pour[];
  readonly orphans: readonly Pour[];
  readonly issues: readonly PlacedIssue[];
};

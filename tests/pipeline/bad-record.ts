import type { RowInput } from '#server/workbook/write-workbook.ts';
import type { Severity } from '#shared/findings/types.ts';
import type { Kind } from '#shared/records/types.ts';

export const LOT = 'LOT-1';

type Found = {
  readonly code: string;
  /** Sheet and field. */
  readonly at: string;
  readonly severity?: Severity;
  readonly measured?: string | number | null;
  readonly limit?: string | number | null;
  /** Words of the sentence or of its remedy. */
  readonly says?: readonly string[];
};
export type BadRecord = {
  readonly what: string;
  readonly kind: Kind;
  readonly structure: string;
  /** Changed on a line that meets every rule. */
  readonly values: RowInput;
  readonly pours?: readonly RowInput[];
  readonly planned?: Readonly<Record<string, string | number>>;
  readonly finds: readonly Found[];
  /** Figures that are still computed, or null for those that cannot be. */
  readonly figures?: Readonly<Record<string, number | null>>;
};

/** WR-01: the void of the line that is not changed, and what fills it. */
export const WHOLE = { voidFt3: 8.6701, fillRatio: 1.0957 };
export const badSet = (structure: string, rest: Omit<BadRecord, 'kind' | 'structure'>): BadRecord => ({
  kind: 'set',
  structure,
  ...rest,
});

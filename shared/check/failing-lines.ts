import type { FieldValues, Kind } from '#shared/records/types.ts';
import type { CheckContext } from '#shared/rules/types.ts';
import { CLEAN_POURS } from './testing.ts';

/** A clean line changed so that one rule alone fails. Limits: the demo standard; numbers worked out beside each. */
export type Failing = {
  readonly code: string;
  /** Of the clean line; *set* unless said. */
  readonly kind?: Kind;
  readonly values?: FieldValues;
  readonly pours?: readonly FieldValues[];
  readonly context?: Partial<CheckContext>;
  readonly expected: Readonly<Record<string, unknown>>;
};

export const [big, small] = CLEAN_POURS.set as readonly [FieldValues, FieldValues];

import type { Skipped } from '#shared/check/types.ts';
import type { ShownFinding } from '#shared/check/shown-finding.ts';
import type { OrderContextData } from '#shared/check/context-from-data.ts';
import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';
import type { TypedLine } from '#shared/workbook/typed-workbook.ts';
import type { RefusalCode, RefusalParams } from '#shared/workbook/workbook-refused.ts';

/** A line as the check leaves it, with what it found on it. */
export type CheckedLine = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
  readonly sheet: string;
  readonly row: number;
  readonly values: FieldValues;
  readonly derived: Derived;
  readonly workDay: string | null;
  readonly standardNumber: number;
  readonly pours: readonly CheckedPour[];
  readonly findings: readonly ShownFinding[];
};

export type CheckedPour = {
  readonly row: number;
  readonly event: number;
  readonly pourNumber: number | null;
  readonly pouredAt: string | null;
  readonly product: string | null;
  readonly lot: string | null;
  readonly kitFt3: number | null;
  readonly quantity: number | null;
  readonly wastedQuantity: number;
};

/** A rule that did not run here, by its title. */
export type NotRun = Skipped & { readonly title: string };

export type ToCheckWorker =
  | { readonly type: 'workbook'; readonly file: Blob; readonly context: OrderContextData }
  | {
      readonly type: 'typed';
      readonly turn: number;
      readonly line: TypedLine;
      readonly context: OrderContextData;
    };

export type FromCheckWorker =
  | { readonly type: 'rows-read'; readonly rows: number }
  /** All is read; the lines will be checked now. */
  | { readonly type: 'lines-read'; readonly lines: number }
  | { readonly type: 'lines'; readonly lines: readonly CheckedLine[] }
  | { readonly type: 'done'; readonly loose: readonly ShownFinding[]; readonly notRun: readonly NotRun[] }
  | {
      readonly type: 'typed';
      readonly turn: number;
      readonly line: CheckedLine | null;
      readonly loose: readonly ShownFinding[];
      readonly notRun: readonly NotRun[];
    }
  | {
      readonly type: 'refused';
      readonly code: RefusalCode;
      readonly params: RefusalParams;
      /** The same sentence as the server's. */
      readonly detail: string;
    }
  | { readonly type: 'fault'; readonly detail: string };

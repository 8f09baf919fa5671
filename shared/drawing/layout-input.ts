import type { SheetFoot, SheetSpec } from './sheet-spec.ts';
import type { SheetFinding, SheetLimits, SheetPurpose, SheetRecord } from './sheet-types.ts';

/** What a layout is made from. */
export type LayoutInput = {
  readonly record: SheetRecord;
  readonly findings: readonly SheetFinding[];
  readonly limits: SheetLimits;
  readonly purpose: SheetPurpose;
  readonly spec: SheetSpec;
  readonly foot: SheetFoot;
  readonly metric: boolean;
};

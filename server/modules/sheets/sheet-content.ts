import type { SheetLimits } from '#shared/drawing/sheet-types.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** What the PDF of one record sheet is made of. Plain data: it may wait in a file. */
export type SheetContent = {
  readonly data: RecordSheetData;
  readonly limits: SheetLimits;
  /** Of the work order: days of decisions are told in it. */
  readonly zone: string;
};

import type { RefusalCode, RefusalParams } from '#shared/workbook/workbook-refused.ts';
import type { WorkbookEvent } from '#shared/workbook/xml/read-package.ts';
import type { PackedRow } from './pack-rows.ts';

/** What the reading process tells the one that started it. An exit before `done` or `refused` is a failure. */
export type ReaderMessage =
  | { readonly type: 'rows'; readonly sheet: number; readonly rows: readonly PackedRow[] }
  | { readonly type: 'event'; readonly event: Exclude<WorkbookEvent, { type: 'rows' }> }
  | { readonly type: 'refused'; readonly code: RefusalCode; readonly params: RefusalParams }
  | { readonly type: 'done' };

import type { RecordName } from '#shared/generated/validators.mjs';
import type { Kind } from '#shared/records/types.ts';

const BY_SHEET: ReadonlyMap<string, RecordName> = new Map([
  ['Set', 'set'],
  ['Straighten', 'straighten'],
  ['Re-level', 'relevel'],
  ['Pours', 'pour'],
  ['Events', 'event'],
  ['Photos', 'photo'],
  ['Batch', 'batch'],
]);

/** The record whose rows a sheet holds; a line's own kind where the sheet is called otherwise. */
export const recordNameOf = (sheet: string, kind: Kind): RecordName => BY_SHEET.get(sheet) ?? kind;

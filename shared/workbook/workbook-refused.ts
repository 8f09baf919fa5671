import type { Scalar } from '#shared/records/types.ts';

/** Why a file is not read at all. One sentence for each stands in refusal-text.ts. */
export const REFUSAL_CODES = [
  'empty-file',
  'file-too-large',
  'not-a-workbook',
  'old-workbook',
  'password-protected',
  'macro-enabled',
  'binary-workbook',
  'other-document',
  'zip-damaged',
  'zip-encrypted',
  'zip-duplicate',
  'zip-too-many-entries',
  'zip-too-large',
  'part-missing',
  'xml-damaged',
  'xml-doctype',
  'xml-too-deep',
  'xml-too-long',
  'string-index',
  'cell-address',
  'cell-twice',
  'too-many-sheets',
  'too-many-rows',
  'too-many-cells',
  'too-much-text',
  'reader-time',
  'reader-memory',
  'reader-failed',
] as const;
export type RefusalCode = (typeof REFUSAL_CODES)[number];

export type RefusalParams = Readonly<Record<string, Scalar>>;

/** A file that is refused as a whole, as code and parameters: nothing of it was taken over. */
export class WorkbookRefused extends Error {
  readonly code: RefusalCode;
  readonly params: RefusalParams;

  constructor(code: RefusalCode, params: RefusalParams = {}) {
    super(`workbook refused: ${code} ${JSON.stringify(params)}`);
    this.name = 'WorkbookRefused';
    this.code = code;
    this.params = params;
  }
}

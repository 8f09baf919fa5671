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
  'too-many-parts',
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
  'too-many-merged',
  'too-much-text',
  'reader-time',
  'reader-memory',
  'reader-failed',
] as const;
export type RefusalCode = (typeof REFUSAL_CODES)[number];

export type RefusalParams = Readonly<Record<string, Scalar>>;

/** Names out of the file go into messages and rows: no longer than a line, and nothing that no store takes. */
function printable(value: Scalar): Scalar {
  if (typeof value !== 'string') return value;
  const short = value.length > 200 ? `${value.slice(0, 199)}…` : value;
  return short.replaceAll('\0', '\ufffd').replace(/\p{Surrogate}/gu, '\ufffd');
}

/** A file that is refused as a whole, as code and parameters: nothing of it was taken over. */
export class WorkbookRefused extends Error {
  readonly code: RefusalCode;
  readonly params: RefusalParams;

  constructor(code: RefusalCode, params: RefusalParams = {}) {
    super(`workbook refused: ${code} ${JSON.stringify(params)}`);
    this.name = 'WorkbookRefused';
    this.code = code;
    this.params = Object.fromEntries(Object.entries(params).map(([name, value]) => [name, printable(value)]));
  }
}

import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';

const OLE = Buffer.from('d0cf11e0a1b11ae1', 'hex');
const ENCRYPTED_PACKAGE = Buffer.from('EncryptedPackage', 'utf16le');

const named = (stream: string): Buffer => Buffer.from(`${stream}\0`, 'utf16le');
/** Streams by which other OLE files are known; a workbook that embeds one of them has its own stream too. */
const OLD_WORKBOOKS = ['Workbook', 'Book'].map(named);
const OTHERS: readonly (readonly [Buffer, string])[] = [
  [named('WordDocument'), 'word'],
  [named('PowerPoint Document'), 'slides'],
  [named('VisioDocument'), 'drawing'],
];

/** An encrypted workbook is an OLE file whose directory names the encrypted package; nearly any other is an old format. */
function refuseOle(bytes: Buffer): never {
  if (bytes.includes(ENCRYPTED_PACKAGE)) throw new WorkbookRefused('password-protected');
  const other = OTHERS.find(([stream]) => bytes.includes(stream));
  if (other === undefined || OLD_WORKBOOKS.some((stream) => bytes.includes(stream))) {
    throw new WorkbookRefused('old-workbook');
  }
  throw new WorkbookRefused('other-document', { what: other[1] });
}

/** Tells by content, never by name, what a file is; returns only for something packed like a workbook. Bytes are the whole file, at most 50 MB. */
export function preflight(bytes: Buffer): void {
  if (bytes.length === 0) throw new WorkbookRefused('empty-file');
  if (bytes.length > READER_LIMITS.fileBytes) {
    throw new WorkbookRefused('file-too-large', { limitMb: READER_LIMITS.fileBytes / 1_000_000 });
  }
  if (bytes.subarray(0, 8).equals(OLE)) refuseOle(bytes);
  const start = bytes.toString('latin1', 0, 4);
  if (start !== 'PK\u0003\u0004') throw new WorkbookRefused('not-a-workbook');
}

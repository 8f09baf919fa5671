import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';

const OLE = Buffer.from('d0cf11e0a1b11ae1', 'hex');
const ENCRYPTED_PACKAGE = Buffer.from('EncryptedPackage', 'utf16le');

/** Tells by content, never by name, what a file is; returns only for something packed like a workbook. Bytes are the whole file, at most 50 MB. */
export function preflight(bytes: Buffer): void {
  if (bytes.length === 0) throw new WorkbookRefused('empty-file');
  if (bytes.length > READER_LIMITS.fileBytes) {
    throw new WorkbookRefused('file-too-large', { limitMb: READER_LIMITS.fileBytes / 1_000_000 });
  }
  if (bytes.subarray(0, 8).equals(OLE)) {
    // An encrypted workbook is an OLE file whose directory names the encrypted package; any other OLE file is an old format.
    throw new WorkbookRefused(bytes.includes(ENCRYPTED_PACKAGE) ? 'password-protected' : 'old-workbook');
  }
  const start = bytes.toString('latin1', 0, 4);
  if (start !== 'PK\u0003\u0004') throw new WorkbookRefused('not-a-workbook');
}

import { READER_LIMITS } from './limits.ts';
import { WorkbookRefused } from './workbook-refused.ts';

const OLE = Uint8Array.of(0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1);
const ZIP = Uint8Array.of(0x50, 0x4b, 3, 4);

/** As the directory of an OLE file writes names. */
const utf16 = (text: string): Uint8Array =>
  Uint8Array.from(
    { length: text.length * 2 },
    (_, at) => (text.charCodeAt(at >> 1) >> (8 * (at & 1))) & 0xff,
  );
const named = (stream: string): Uint8Array => utf16(`${stream}\0`);

const ENCRYPTED_PACKAGE = utf16('EncryptedPackage');
/** Streams by which other OLE files are known; a workbook that embeds one of them has its own stream too. */
const OLD_WORKBOOKS = ['Workbook', 'Book'].map(named);
const OTHERS: readonly (readonly [Uint8Array, string])[] = [
  [named('WordDocument'), 'word'],
  [named('PowerPoint Document'), 'slides'],
  [named('VisioDocument'), 'drawing'],
];

const startsWith = (bytes: Uint8Array, start: Uint8Array, at = 0): boolean =>
  start.every((byte, index) => bytes[at + index] === byte);

function includes(bytes: Uint8Array, wanted: Uint8Array): boolean {
  let at = bytes.indexOf(wanted[0]!);
  while (at !== -1) {
    if (startsWith(bytes, wanted, at)) return true;
    at = bytes.indexOf(wanted[0]!, at + 1);
  }
  return false;
}

/** An encrypted workbook is an OLE file whose directory names the encrypted package; nearly any other is an old format. */
function refuseOle(bytes: Uint8Array): never {
  if (includes(bytes, ENCRYPTED_PACKAGE)) throw new WorkbookRefused('password-protected');
  const other = OTHERS.find(([stream]) => includes(bytes, stream));
  if (other === undefined || OLD_WORKBOOKS.some((stream) => includes(bytes, stream))) {
    throw new WorkbookRefused('old-workbook');
  }
  throw new WorkbookRefused('other-document', { what: other[1] });
}

/** Refuses by size before anything is read. */
export function checkFileSize(size: number): void {
  if (size === 0) throw new WorkbookRefused('empty-file');
  if (size > READER_LIMITS.fileBytes) {
    throw new WorkbookRefused('file-too-large', { limitMb: READER_LIMITS.fileBytes / 1_000_000 });
  }
}

/** Tells by content, never by name, what a file is; returns only for something packed like a workbook. Bytes are the whole file, at most 50 MB. */
export function preflight(bytes: Uint8Array): void {
  checkFileSize(bytes.length);
  if (startsWith(bytes, OLE)) refuseOle(bytes);
  if (!startsWith(bytes, ZIP)) throw new WorkbookRefused('not-a-workbook');
}

/** The same for a file that need not be read whole: only one of another format is. */
export async function preflightBlob(file: Blob): Promise<void> {
  checkFileSize(file.size);
  const start = new Uint8Array(await file.slice(0, OLE.length).arrayBuffer());
  if (startsWith(start, OLE)) refuseOle(new Uint8Array(await file.arrayBuffer()));
  if (!startsWith(start, ZIP)) throw new WorkbookRefused('not-a-workbook');
}

import { WorkbookRefused } from './workbook-refused.ts';
import { checkEntryCount, createAdmission, entryName, type PackedEntry } from './zip-limits.ts';

export type ZipEntry = PackedEntry & {
  readonly method: number;
  readonly crc32: number;
  /** Where its local header begins. */
  readonly offset: number;
};

const END = 0x06054b50;
const END_SIZE = 22;
const END_64 = 0x06064b50;
const END_64_SIZE = 56;
const LOCATOR_64 = 0x07064b50;
const LOCATOR_64_SIZE = 20;
const LONGEST_COMMENT = 0xffff;
const ENTRY = 0x02014b50;
const ENTRY_SIZE = 46;
const LOCAL = 0x04034b50;
const LOCAL_SIZE = 30;
const EXTRA_64 = 1;
/** "See the 64-bit field instead". */
const FULL = 0xffffffff;
const ENCRYPTED = 1;
const STRONGLY_ENCRYPTED = 0x40;
const STORED = 0;

const damaged = (part?: string): WorkbookRefused =>
  new WorkbookRefused('zip-damaged', part === undefined ? {} : { part });

/** A piece of the file as numbers; reading outside of it throws RangeError. */
async function view(file: Blob, from: number, to: number): Promise<DataView> {
  if (!(from >= 0 && to <= file.size)) throw damaged();
  return new DataView(await file.slice(from, to).arrayBuffer());
}

/** Exact below 2^53; nothing in a file of some megabytes lies further. */
const big = (bytes: DataView, at: number): number => Number(bytes.getBigUint64(at, true));

type Place = { readonly entries: number; readonly offset: number };

/** The record at the file's end, which may carry a comment and nothing after it. */
async function findDirectory(file: Blob): Promise<Place> {
  const from = Math.max(0, file.size - LOCATOR_64_SIZE - END_SIZE - LONGEST_COMMENT);
  const tail = await view(file, from, file.size);
  let at = tail.byteLength - END_SIZE;
  while (at >= 0 && tail.getUint32(at, true) !== END) at--;
  if (at < 0 || tail.getUint16(at + 20, true) !== tail.byteLength - at - END_SIZE) throw damaged();
  const locator = at - LOCATOR_64_SIZE;
  if (locator >= 0 && tail.getUint32(locator, true) === LOCATOR_64) {
    const start = big(tail, locator + 8);
    const end = await view(file, start, start + END_64_SIZE);
    if (end.getUint32(0, true) !== END_64 || end.getUint32(16, true) !== 0) throw damaged();
    return { entries: big(end, 32), offset: big(end, 48) };
  }
  if (tail.getUint16(at + 4, true) !== 0) throw damaged();
  return { entries: tail.getUint16(at + 10, true), offset: tail.getUint32(at + 16, true) };
}

/** The sizes and the place of an entry whose 32-bit fields are full, in this order where present. */
function extra64(bytes: DataView, from: number, to: number): () => number {
  for (let at = from; at < to - 3;) {
    const size = bytes.getUint16(at + 2, true);
    const end = at + 4 + size;
    if (end > to) throw damaged();
    if (bytes.getUint16(at, true) === EXTRA_64) {
      let next = at + 4;
      return () => {
        if (next + 8 > end) throw damaged();
        next += 8;
        return big(bytes, next - 8);
      };
    }
    at = end;
  }
  // Without one the full field is a number like any other.
  return () => FULL;
}

/** Every following field must be whole too, whoever uses it. */
function checkExtras(bytes: DataView, from: number, to: number): void {
  for (let at = from; at < to - 3;) {
    at += 4 + bytes.getUint16(at + 2, true);
    if (at > to) throw damaged();
  }
}

function readEntry(bytes: DataView, at: number): { name: string; entry: ZipEntry; next: number } {
  if (bytes.getUint32(at, true) !== ENTRY) throw damaged();
  const flags = bytes.getUint16(at + 8, true);
  if ((flags & STRONGLY_ENCRYPTED) !== 0) throw new WorkbookRefused('zip-encrypted');
  const nameEnd = at + ENTRY_SIZE + bytes.getUint16(at + 28, true);
  const extraEnd = nameEnd + bytes.getUint16(at + 30, true);
  const next = extraEnd + bytes.getUint16(at + 32, true);
  if (next > bytes.byteLength) throw damaged();
  checkExtras(bytes, nameEnd, extraEnd);
  const in64 = extra64(bytes, nameEnd, extraEnd);
  const field = (offset: number): number => {
    const value = bytes.getUint32(at + offset, true);
    return value === FULL ? in64() : value;
  };
  const inflated = field(24);
  const packed = field(20);
  const offset = field(42);
  const method = bytes.getUint16(at + 10, true);
  const encrypted = (flags & ENCRYPTED) !== 0;
  if (method === STORED && packed !== inflated + (encrypted ? 12 : 0)) throw damaged();
  const name = entryName(
    new Uint8Array(bytes.buffer, bytes.byteOffset + at + ENTRY_SIZE, nameEnd - at - ENTRY_SIZE),
    flags,
  );
  const crc32 = bytes.getUint32(at + 16, true);
  return { name, entry: { packed, inflated, encrypted, method, crc32, offset }, next };
}

/** The parts of a zip file by name, all of them looked at before any is inflated. Throws WorkbookRefused. */
export async function readZipDirectory(file: Blob): Promise<ReadonlyMap<string, ZipEntry>> {
  try {
    const { entries, offset } = await findDirectory(file);
    checkEntryCount(entries);
    const bytes = await view(file, offset, file.size);
    const admission = createAdmission<ZipEntry>();
    let at = 0;
    for (let count = 0; count < entries; count++) {
      const { name, entry, next } = readEntry(bytes, at);
      admission.admit(name, entry);
      at = next;
    }
    return admission.parts;
  } catch (error) {
    throw error instanceof RangeError ? damaged() : error;
  }
}

/** Where the packed bytes of an entry begin. Throws WorkbookRefused. */
export async function findPacked(file: Blob, entry: ZipEntry, part: string): Promise<number> {
  try {
    const local = await view(file, entry.offset, entry.offset + LOCAL_SIZE);
    const start = entry.offset + LOCAL_SIZE + local.getUint16(26, true) + local.getUint16(28, true);
    if (local.getUint32(0, true) !== LOCAL || start + entry.packed > file.size) throw damaged(part);
    return start;
  } catch {
    throw damaged(part);
  }
}

import { READER_LIMITS } from './limits.ts';
import { WorkbookRefused } from './workbook-refused.ts';
import { partName } from './xml/resolve-target.ts';

/** What a zip file's directory says of one entry. Sizes in bytes. */
export type PackedEntry = {
  readonly packed: number;
  readonly inflated: number;
  readonly encrypted: boolean;
};

/** Bit of an entry's flags that says its name is UTF-8. */
const UTF8_NAME = 0x800;

/** The name of a part from the bytes of a directory, as all of the reader compares it. */
export function entryName(bytes: Uint8Array, flags: number): string {
  if ((flags & UTF8_NAME) !== 0) return partName(new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes));
  // Byte by byte: a decoder called latin1 would be one of Windows' own.
  let name = '';
  for (const byte of bytes) name += String.fromCharCode(byte);
  return partName(name);
}

/** Larger than any part of a real workbook, or packed far tighter than one. */
export function isBomb(inflated: number, packed: number): boolean {
  if (inflated > READER_LIMITS.partBytes) return true;
  return inflated > READER_LIMITS.ratioFromBytes && inflated > READER_LIMITS.ratio * packed;
}

/** Throws WorkbookRefused for a directory with more entries than any workbook has. */
export function checkEntryCount(count: number): void {
  if (count > READER_LIMITS.zipEntries) {
    throw new WorkbookRefused('zip-too-many-entries', { limit: READER_LIMITS.zipEntries });
  }
}

/** Parts admitted so far; every entry is looked at before any is inflated. */
export type Admission<T extends PackedEntry> = {
  /** Throws WorkbookRefused. */
  readonly admit: (name: string, entry: T) => void;
  readonly parts: ReadonlyMap<string, T>;
};

export function createAdmission<T extends PackedEntry>(): Admission<T> {
  const parts = new Map<string, T>();
  let total = 0;
  return {
    parts,
    admit: (name, entry) => {
      if (entry.encrypted) throw new WorkbookRefused('zip-encrypted', { part: name });
      if (isBomb(entry.inflated, entry.packed)) throw new WorkbookRefused('zip-too-large', { part: name });
      total += entry.inflated;
      if (total > READER_LIMITS.totalBytes) throw new WorkbookRefused('zip-too-large');
      if (parts.has(name)) throw new WorkbookRefused('zip-duplicate', { part: name });
      if (!name.endsWith('/')) parts.set(name, entry);
    },
  };
}

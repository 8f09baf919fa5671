import type { Readable } from 'node:stream';
import yauzl, { type Entry, type ZipFile } from 'yauzl';
import { crc32 } from '#shared/workbook/crc32.ts';
import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { partName } from '#shared/workbook/xml/resolve-target.ts';
import type { PartSource } from '#shared/workbook/xml/part-source.ts';

export type ZipSource = PartSource & { readonly close: () => void };

const damaged = (part?: string): WorkbookRefused =>
  new WorkbookRefused('zip-damaged', part === undefined ? {} : { part });

function openZip(bytes: Buffer): Promise<ZipFile> {
  return new Promise((resolve, reject) => {
    // Names come undecoded, so that odd ones reach our own normalising instead of a refusal of the whole file.
    const options = { lazyEntries: true, autoClose: false, decodeStrings: false, validateEntrySizes: true };
    yauzl.fromBuffer(bytes, options, (error, zip) => (error ? reject(damaged()) : resolve(zip)));
  });
}

function nameOf(entry: Entry): string {
  const raw: unknown = entry.fileName;
  const bytes = Buffer.isBuffer(raw) ? raw : Buffer.from(String(raw));
  return partName(bytes.toString((entry.generalPurposeBitFlag & 0x800) === 0 ? 'latin1' : 'utf8'));
}

function checkEntry(entry: Entry, part: string): void {
  if (entry.isEncrypted()) throw new WorkbookRefused('zip-encrypted', { part });
  if (isBomb(entry.uncompressedSize, entry.compressedSize))
    throw new WorkbookRefused('zip-too-large', { part });
}

function isBomb(inflated: number, packed: number): boolean {
  if (inflated > READER_LIMITS.partBytes) return true;
  return inflated > READER_LIMITS.ratioFromBytes && inflated > READER_LIMITS.ratio * packed;
}

/** The directory of a zip file: every entry looked at before any is inflated. */
function readDirectory(zip: ZipFile): Promise<Map<string, Entry>> {
  return new Promise((resolve, reject) => {
    if (zip.entryCount > READER_LIMITS.zipEntries) {
      reject(new WorkbookRefused('zip-too-many-entries', { limit: READER_LIMITS.zipEntries }));
      return;
    }
    const entries = new Map<string, Entry>();
    let total = 0;
    zip.on('error', (error: Error) =>
      reject(/encryption/.test(error.message) ? new WorkbookRefused('zip-encrypted') : damaged()),
    );
    zip.on('end', () => resolve(entries));
    zip.on('entry', (entry: Entry) => {
      try {
        const name = nameOf(entry);
        checkEntry(entry, name);
        total += entry.uncompressedSize;
        if (total > READER_LIMITS.totalBytes) throw new WorkbookRefused('zip-too-large');
        if (entries.has(name)) throw new WorkbookRefused('zip-duplicate', { part: name });
        if (!name.endsWith('/')) entries.set(name, entry);
        zip.readEntry();
      } catch (error) {
        reject(error as Error);
      }
    });
    zip.readEntry();
  });
}

function openStream(zip: ZipFile, entry: Entry, part: string): Promise<Readable> {
  return new Promise((resolve, reject) => {
    zip.openReadStream(entry, (error, stream) => (error ? reject(damaged(part)) : resolve(stream)));
  });
}

/** Parts of a zip file held in memory. Inflated bytes are counted, not believed, and checked against the entry's CRC. */
export async function openZipSource(bytes: Buffer): Promise<ZipSource> {
  const zip = await openZip(bytes);
  let inflatedInAll = 0;
  async function* inflate(entry: Entry, part: string): AsyncGenerator<Uint8Array> {
    const stream = await openStream(zip, entry, part);
    let inflated = 0;
    let crc = 0;
    try {
      for await (const chunk of stream as AsyncIterable<Buffer>) {
        inflated += chunk.length;
        inflatedInAll += chunk.length;
        if (inflatedInAll > READER_LIMITS.totalBytes || isBomb(inflated, entry.compressedSize)) {
          throw new WorkbookRefused('zip-too-large', { part });
        }
        crc = crc32(chunk, crc);
        yield chunk;
      }
    } catch (error) {
      throw error instanceof WorkbookRefused ? error : damaged(part);
    } finally {
      stream.destroy();
    }
    if (crc !== entry.crc32) throw damaged(part);
  }
  try {
    const entries = await readDirectory(zip);
    return {
      names: [...entries.keys()],
      has: (name) => entries.has(name),
      open: (name) => {
        const entry = entries.get(name);
        if (entry === undefined) throw new WorkbookRefused('part-missing', { part: name });
        return inflate(entry, name);
      },
      close: () => zip.close(),
    };
  } catch (error) {
    zip.close();
    throw error;
  }
}

import type { Readable } from 'node:stream';
import yauzl, { type Entry, type ZipFile } from 'yauzl';
import { crc32 } from '#shared/workbook/crc32.ts';
import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { partName } from '#shared/workbook/xml/resolve-target.ts';
import type { PartSource } from '#shared/workbook/xml/part-source.ts';

export type ZipSource = PartSource & { readonly close: () => void };

const damaged = (): WorkbookRefused => new WorkbookRefused('zip-damaged');

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

function checkEntry(entry: Entry): void {
  if (entry.isEncrypted()) throw new WorkbookRefused('zip-encrypted');
  if (isBomb(entry.uncompressedSize, entry.compressedSize)) throw new WorkbookRefused('zip-too-large');
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
    zip.on('error', () => reject(damaged()));
    zip.on('end', () => resolve(entries));
    zip.on('entry', (entry: Entry) => {
      try {
        checkEntry(entry);
        total += entry.uncompressedSize;
        if (total > READER_LIMITS.totalBytes) throw new WorkbookRefused('zip-too-large');
        const name = nameOf(entry);
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

function openStream(zip: ZipFile, entry: Entry): Promise<Readable> {
  return new Promise((resolve, reject) => {
    zip.openReadStream(entry, (error, stream) => (error ? reject(damaged()) : resolve(stream)));
  });
}

/** Parts of a zip file held in memory. Inflated bytes are counted, not believed, and checked against the entry's CRC. */
export async function openZipSource(bytes: Buffer): Promise<ZipSource> {
  const zip = await openZip(bytes);
  let inflatedInAll = 0;
  async function* inflate(entry: Entry): AsyncGenerator<Uint8Array> {
    const stream = await openStream(zip, entry);
    let inflated = 0;
    let crc = 0;
    try {
      for await (const chunk of stream as AsyncIterable<Buffer>) {
        inflated += chunk.length;
        inflatedInAll += chunk.length;
        if (inflatedInAll > READER_LIMITS.totalBytes || isBomb(inflated, entry.compressedSize)) {
          throw new WorkbookRefused('zip-too-large');
        }
        crc = crc32(chunk, crc);
        yield chunk;
      }
    } catch (error) {
      throw error instanceof WorkbookRefused ? error : damaged();
    } finally {
      stream.destroy();
    }
    if (crc !== entry.crc32) throw damaged();
  }
  try {
    const entries = await readDirectory(zip);
    return {
      names: [...entries.keys()],
      has: (name) => entries.has(name),
      open: (name) => {
        const entry = entries.get(name);
        if (entry === undefined) throw new WorkbookRefused('part-missing', { part: name });
        return inflate(entry);
      },
      close: () => zip.close(),
    };
  } catch (error) {
    zip.close();
    throw error;
  }
}

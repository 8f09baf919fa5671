import type { Readable } from 'node:stream';
import yauzl, { type Entry, type ZipFile } from 'yauzl';
import { inflateCounted } from '#shared/workbook/inflate-counted.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import {
  checkEntryCount,
  createAdmission,
  entryName,
  type PackedEntry,
} from '#shared/workbook/zip-limits.ts';
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

type ZipPart = PackedEntry & { readonly entry: Entry };

function nameOf(entry: Entry): string {
  const raw: unknown = entry.fileName;
  const bytes = Buffer.isBuffer(raw) ? raw : Buffer.from(String(raw));
  return entryName(bytes, entry.generalPurposeBitFlag);
}

/** The directory of a zip file: every entry looked at before any is inflated. */
function readDirectory(zip: ZipFile): Promise<ReadonlyMap<string, ZipPart>> {
  return new Promise((resolve, reject) => {
    try {
      checkEntryCount(zip.entryCount);
    } catch (error) {
      reject(error as Error);
      return;
    }
    const admission = createAdmission<ZipPart>();
    zip.on('error', (error: Error) =>
      reject(/encryption/.test(error.message) ? new WorkbookRefused('zip-encrypted') : damaged()),
    );
    zip.on('end', () => resolve(admission.parts));
    zip.on('entry', (entry: Entry) => {
      try {
        admission.admit(nameOf(entry), {
          packed: entry.compressedSize,
          inflated: entry.uncompressedSize,
          encrypted: entry.isEncrypted(),
          entry,
        });
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
  const inAll = { bytes: 0 };
  try {
    const entries = await readDirectory(zip);
    return {
      names: [...entries.keys()],
      has: (name) => entries.has(name),
      open: (name) => {
        const entry = entries.get(name);
        if (entry === undefined) throw new WorkbookRefused('part-missing', { part: name });
        return inflateCounted(
          {
            name,
            packed: entry.packed,
            crc32: entry.entry.crc32,
            open: () => openStream(zip, entry.entry, name),
          },
          inAll,
        );
      },
      close: () => zip.close(),
    };
  } catch (error) {
    zip.close();
    throw error;
  }
}

import { crc32 } from './crc32.ts';
import { READER_LIMITS } from './limits.ts';
import { WorkbookRefused } from './workbook-refused.ts';
import { isBomb } from './zip-limits.ts';

export type InflatedPart = {
  readonly name: string;
  /** Bytes in the file. */
  readonly packed: number;
  readonly crc32: number;
  /** Opens the inflated bytes; ends early when its consumer does. */
  readonly open: () => AsyncIterable<Uint8Array> | Promise<AsyncIterable<Uint8Array>>;
};

/** Inflated bytes of a whole file, counted over its parts. */
export type InflatedInAll = { bytes: number };

/** The bytes of a part as they come, counted, not believed, and checked against its CRC. Throws WorkbookRefused. */
export async function* inflateCounted(part: InflatedPart, inAll: InflatedInAll): AsyncGenerator<Uint8Array> {
  const damaged = (): WorkbookRefused => new WorkbookRefused('zip-damaged', { part: part.name });
  let inflated = 0;
  let crc = 0;
  try {
    for await (const chunk of await part.open()) {
      inflated += chunk.length;
      inAll.bytes += chunk.length;
      if (inAll.bytes > READER_LIMITS.totalBytes || isBomb(inflated, part.packed)) {
        throw new WorkbookRefused('zip-too-large', { part: part.name });
      }
      crc = crc32(chunk, crc);
      yield chunk;
    }
  } catch (error) {
    throw error instanceof WorkbookRefused ? error : damaged();
  }
  if (crc !== part.crc32) throw damaged();
}

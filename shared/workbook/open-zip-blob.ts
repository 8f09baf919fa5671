import { inflateCounted } from './inflate-counted.ts';
import { WorkbookRefused } from './workbook-refused.ts';
import type { PartSource } from './xml/part-source.ts';
import { findPacked, readZipDirectory, type ZipEntry } from './zip-directory.ts';

const STORED = 0;
const DEFLATED = 8;
/** As large as the server's inflating hands on: what goes without an end is noticed after as many bytes here as there. */
const PIECE = 16_384;

async function* chunksOf(stream: ReadableStream<Uint8Array>): AsyncGenerator<Uint8Array> {
  const reader = stream.getReader();
  try {
    for (;;) {
      const { done, value } = await reader.read();
      if (done) return;
      for (let at = 0; at < value.length; at += PIECE) yield value.subarray(at, at + PIECE);
    }
  } finally {
    // Ended early, nothing more is inflated; a stream that failed already fails again.
    await reader.cancel().catch(() => undefined);
  }
}

/** Exactly as many bytes as the directory says; a further one is never handed on. */
async function* exactly(size: number, chunks: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array> {
  let length = 0;
  for await (const chunk of chunks) {
    length += chunk.length;
    if (length > size) throw new RangeError('more bytes than the directory says');
    yield chunk;
  }
  if (length !== size) throw new RangeError('fewer bytes than the directory says');
}

/**
 * Parts of a zip file by what every browser has: slices of the file, and its own inflating. The packages for this either
 * start workers of their own from data addresses, which the content security policy forbids, or tell damage less
 * exactly than the server's reader, and both must refuse the same files for the same reason.
 */
export async function openZipBlob(file: Blob): Promise<PartSource> {
  const entries = await readZipDirectory(file);
  const inAll = { bytes: 0 };
  const open = (entry: ZipEntry, name: string) => async (): Promise<AsyncIterable<Uint8Array>> => {
    if (entry.method !== STORED && entry.method !== DEFLATED)
      throw new WorkbookRefused('zip-damaged', { part: name });
    const start = await findPacked(file, entry, name);
    const packed = file.slice(start, start + entry.packed).stream();
    return exactly(
      entry.inflated,
      chunksOf(entry.method === STORED ? packed : packed.pipeThrough(new DecompressionStream('deflate-raw'))),
    );
  };
  return {
    names: [...entries.keys()],
    has: (name) => entries.has(name),
    open: (name) => {
      const entry = entries.get(name);
      if (entry === undefined) throw new WorkbookRefused('part-missing', { part: name });
      const { packed, crc32 } = entry;
      return inflateCounted({ name, packed, crc32, open: open(entry, name) }, inAll);
    },
  };
}

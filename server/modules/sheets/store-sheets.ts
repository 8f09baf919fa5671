import { setImmediate as turn } from 'node:timers/promises';
import type { BlobStore, StoredBlob } from '#server/storage/blob-store.ts';
import { createPdf } from './create-pdf.ts';
import { layOutSheet } from './lay-out-sheet.ts';
import type { Paper } from './paper.ts';
import type { SheetSpool } from './sheet-spool.ts';
import { markWriter } from './write-marks.ts';
import { writePages } from './write-pages.ts';

/** No batch's sheets come near it; a fault that writes without end does. */
const MAX_BYTES = 1024 * 1024 * 1024;
/** What may wait for the store before more is written. */
const WAITING_BYTES = 4 * 1024 * 1024;

type Options = {
  readonly spool: SheetSpool;
  readonly paper: Paper;
  /** Of the whole file. */
  readonly pages: number;
  readonly title: string;
  readonly author: string;
  readonly madeAt: Date;
  readonly signal: AbortSignal;
};

/** Writes the sheets as one PDF, page x of y through the file, while it is stored. */
export async function storeSheets(blobs: BlobStore, options: Options): Promise<StoredBlob> {
  const doc = createPdf(options);
  const stored = blobs.putStream(doc, { maxBytes: MAX_BYTES, signal: options.signal });
  const written = writeAll(doc, options).catch((error: unknown) => {
    doc.destroy(error as Error);
    throw error;
  });
  const [blob] = await Promise.all([stored, written]);
  return blob;
}

async function writeAll(
  doc: PDFKit.PDFDocument,
  { spool, paper, pages: total, signal }: Options,
): Promise<void> {
  const write = markWriter(doc);
  let first = 1;
  for await (const content of spool.read()) {
    signal.throwIfAborted();
    const pages = layOutSheet(content, paper);
    writePages(doc, { pages, first, total, write });
    first += pages.length;
    // The document takes whatever it is given: wait here until the store has caught up.
    while (doc.readableLength > WAITING_BYTES && !doc.destroyed) await turn();
  }
  doc.end();
}

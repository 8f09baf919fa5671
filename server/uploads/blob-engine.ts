import { Readable } from 'node:stream';
import type { Request } from 'express';
import type { StorageEngine } from 'multer';
import { BlobTooLarge, type BlobStore } from '#server/storage/blob-store.ts';

import { createSlots } from '#server/workbook/slots.ts';
import { safeFileName } from './safe-file-name.ts';

export type FileRefusal = { readonly code: string; readonly detail: string };

/** One file of a request, on its way into the blob store or refused by itself; the others of the request go on. */
export type ReceivedFile = {
  readonly fileName: string;
  readonly stored: { readonly sha256: string; readonly size: number; readonly type: string | null } | null;
  readonly refused: FileRefusal | null;
};

export type Admission = { readonly type: string | null } | FileRefusal;

export type EngineOptions = {
  readonly blobs: BlobStore;
  readonly maxBytes: number;
  /** How many first bytes `admit` sees. */
  readonly headBytes: number;
  /** By content, never by name. */
  readonly admit: (head: Uint8Array) => Admission;
  readonly tooLarge: FileRefusal;
  readonly received: ReceivedFile[];
};

/** Files of one request on their way at once: the rest waits unread, so that memory does not grow with their number. */
const AT_ONCE = 3;

/** Multer's storage as a stream into the blob store: no file is held in memory or left in a folder. Files stand in `received` in the order of the request. */
export function blobEngine(options: EngineOptions): StorageEngine {
  const inSlot = createSlots(AT_ONCE);
  let files = 0;
  return {
    _handleFile(_req: Request, file, done) {
      const place = files++;
      inSlot(() => receive(file.stream, safeFileName(file.originalname), options)).then(
        (received) => {
          options.received[place] = received;
          done(null, {});
        },
        (error: Error) => done(error),
      );
    },
    // What is in the blob store is found by its content and swept when nothing refers to it.
    _removeFile(_req: Request, _file, done) {
      done(null);
    },
  };
}

async function receive(stream: Readable, fileName: string, options: EngineOptions): Promise<ReceivedFile> {
  const chunks = stream[Symbol.asyncIterator]() as AsyncIterator<Buffer>;
  const head = await readHead(chunks, options.headBytes);
  const admission = options.admit(head);
  if ('code' in admission) {
    await drain(chunks);
    return { fileName, stored: null, refused: admission };
  }
  try {
    const { sha256, size } = await options.blobs.putStream(
      Readable.from(whole(head, chunks), { objectMode: false }),
      {
        maxBytes: options.maxBytes,
      },
    );
    return { fileName, stored: { sha256, size, type: admission.type }, refused: null };
  } catch (error) {
    if (!(error instanceof BlobTooLarge)) throw error;
    await drain(chunks);
    return { fileName, stored: null, refused: options.tooLarge };
  }
}

async function readHead(chunks: AsyncIterator<Buffer>, bytes: number): Promise<Buffer> {
  const parts: Buffer[] = [];
  let length = 0;
  while (length < bytes) {
    const next = await chunks.next();
    if (next.done) break;
    parts.push(next.value);
    length += next.value.length;
  }
  return Buffer.concat(parts);
}

async function* whole(head: Buffer, rest: AsyncIterator<Buffer>): AsyncGenerator<Buffer> {
  if (head.length > 0) yield head;
  for (let next = await rest.next(); !next.done; next = await rest.next()) yield next.value;
}

/** A refused file is read to its end, or the rest of the request could not be. */
async function drain(chunks: AsyncIterator<Buffer>): Promise<void> {
  while (!(await chunks.next()).done);
}

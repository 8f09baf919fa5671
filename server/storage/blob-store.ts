import { createHash, randomUUID } from 'node:crypto';
import { createReadStream, createWriteStream } from 'node:fs';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import {
  BlobServiceClient,
  RestError,
  StorageRetryPolicyType,
  type BlockBlobClient,
  type ContainerClient,
} from '@azure/storage-blob';

const CONTAINER = 'upstand';
/** Beneath here lie uploads under way; the sweeper leaves young ones alone. */
export const INCOMING = 'incoming/';
/** Blocks of the store: it takes 50,000 of them, far more than any file here has. */
const BUFFER_BYTES = 1024 * 1024;
const BUFFERS = 2;
const COPY_POLL_MS = 250;

export type StoredBlob = {
  readonly sha256: string;
  readonly size: number;
  /** The same bytes were there already. */
  readonly existed: boolean;
};

export class BlobTooLarge extends Error {
  constructor(readonly maxBytes: number) {
    super(`The file has more than ${maxBytes} bytes.`);
    this.name = 'BlobTooLarge';
  }
}

export class BlobMissing extends Error {
  constructor(readonly sha256: string) {
    super(`The store has no file ${sha256}.`);
    this.name = 'BlobMissing';
  }
}

/** The store answered, and did not take the file: it is full, say, or our key no longer counts. */
export class BlobRefused extends Error {
  constructor(
    readonly statusCode: number,
    options?: ErrorOptions,
  ) {
    super(`The store of files did not take a file: it answered ${statusCode}.`, options);
    this.name = 'BlobRefused';
  }
}

type PutOptions = { readonly maxBytes: number; readonly signal?: AbortSignal };
type ReadOptions = {
  /** First byte wanted. */
  readonly offset?: number;
  readonly count?: number;
  readonly signal?: AbortSignal;
};

const SHA256 = /^[0-9a-f]{64}$/;

/** In folders by the first two digits: a plain list of the container stays readable. */
function nameOf(sha256: string): string {
  if (!SHA256.test(sha256)) throw new RangeError('A blob is named by 64 hexadecimal digits.');
  return `${sha256.slice(0, 2)}/${sha256}`;
}

function isMissing(error: unknown): boolean {
  return (error as { statusCode?: number }).statusCode === 404;
}

/** Passes bytes on, counts and hashes them, and breaks off above the limit. */
function measure(maxBytes: number) {
  const hash = createHash('sha256');
  let size = 0;
  const through = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      size += chunk.length;
      if (size > maxBytes) return done(new BlobTooLarge(maxBytes));
      hash.update(chunk);
      return done(null, chunk);
    },
  });
  return { through, result: () => ({ sha256: hash.digest('hex'), size }) };
}

/** Content-addressed store: a file is named by the SHA-256 of its bytes and never changes. */
export class BlobStore {
  constructor(readonly container: ContainerClient) {}

  /**
   * Streams a file in; no more than two buffers are in memory. Uploaded under a passing name while it is hashed, then
   * copied to its own name inside the store. Whatever ends it early leaves nothing behind.
   * @throws BlobTooLarge above `maxBytes`; BlobRefused; the source's own error; AbortError
   */
  async putStream(source: Readable, options: PutOptions): Promise<StoredBlob> {
    const incoming = this.container.getBlockBlobClient(`${INCOMING}${randomUUID()}`);
    const { through, result } = measure(options.maxBytes);
    const broken = new AbortController();
    const signal = AbortSignal.any([broken.signal, ...(options.signal ? [options.signal] : [])]);
    // The upload does not end by itself when its source breaks off, so each stops the other.
    const fed = pipeline(source, through, { signal }).catch((error: unknown) => {
      broken.abort();
      throw error;
    });
    const sent = incoming
      .uploadStream(through, BUFFER_BYTES, BUFFERS, { abortSignal: signal })
      .catch((error: unknown) => {
        through.destroy(error as Error);
        throw error;
      });
    try {
      const [feeding, sending] = await Promise.allSettled([fed, sent]);
      if (feeding.status === 'rejected' && !isAbort(feeding.reason)) throw feeding.reason;
      if (sending.status === 'rejected') throw sending.reason;
      if (feeding.status === 'rejected') throw feeding.reason;
      const { sha256, size } = result();
      return { sha256, size, existed: await this.#settle(incoming, sha256) };
    } catch (error) {
      throw refusalOf(error);
    } finally {
      // Left behind if the store is away just now; the sweeper takes it then.
      await incoming.deleteIfExists().catch(() => undefined);
    }
  }

  putFile(path: string, options: PutOptions): Promise<StoredBlob> {
    return this.putStream(createReadStream(path), options);
  }

  /** @throws BlobMissing */
  async openRead(sha256: string, options: ReadOptions = {}): Promise<Readable> {
    try {
      const reply = await this.#blob(sha256).download(options.offset ?? 0, options.count, {
        maxRetryRequests: 3,
        ...(options.signal ? { abortSignal: options.signal } : {}),
      });
      if (reply.readableStreamBody === undefined) throw new BlobMissing(sha256);
      return reply.readableStreamBody as Readable;
    } catch (error) {
      if (isMissing(error)) throw new BlobMissing(sha256);
      throw error;
    }
  }

  /** Writes the file to `path`, which must not exist yet. @throws BlobMissing */
  async readTo(sha256: string, path: string, options: ReadOptions = {}): Promise<void> {
    const source = await this.openRead(sha256, options);
    const target = createWriteStream(path, { flags: 'wx', mode: 0o600 });
    await pipeline(source, target, options.signal ? { signal: options.signal } : {});
  }

  exists(sha256: string): Promise<boolean> {
    return this.#blob(sha256).exists();
  }

  /** Bytes, or null when there is no such file. */
  async size(sha256: string): Promise<number | null> {
    try {
      return (await this.#blob(sha256).getProperties()).contentLength ?? null;
    } catch (error) {
      if (isMissing(error)) return null;
      throw error;
    }
  }

  /** For tests and tools; what is unreferenced is swept. */
  async delete(sha256: string): Promise<void> {
    await this.#blob(sha256).deleteIfExists();
  }

  /** Deletes it unless it was written or seen since `before`. True: it is gone. */
  async deleteIfOld(sha256: string, before: Date): Promise<boolean> {
    return deleteIfOld(this.#blob(sha256), before);
  }

  /** Every name with its last change. */
  async *list(): AsyncGenerator<{ name: string; sha256: string | null; changedAt: Date }> {
    for await (const item of this.container.listBlobsFlat()) {
      const sha256 = item.name.slice(item.name.indexOf('/') + 1);
      yield {
        name: item.name,
        sha256: SHA256.test(sha256) && !item.name.startsWith(INCOMING) ? sha256 : null,
        changedAt: item.properties.lastModified,
      };
    }
  }

  async deleteIncoming(name: string, before: Date): Promise<boolean> {
    if (!name.startsWith(INCOMING))
      throw new RangeError('Only an upload under way has no hash for its name.');
    return deleteIfOld(this.container.getBlockBlobClient(name), before);
  }

  #blob(sha256: string): BlockBlobClient {
    return this.container.getBlockBlobClient(nameOf(sha256));
  }

  /** True: the same bytes were there already. */
  async #settle(incoming: BlockBlobClient, sha256: string): Promise<boolean> {
    const target = this.#blob(sha256);
    for (;;) {
      try {
        const copy = await target.beginCopyFromURL(incoming.url, {
          conditions: { ifNoneMatch: '*' },
          intervalInMs: COPY_POLL_MS,
        });
        const { copyStatus } = await copy.pollUntilDone();
        if (copyStatus !== 'success')
          throw new Error(`The store did not take the file over (${copyStatus}).`);
        return false;
      } catch (error) {
        if ((error as { statusCode?: number }).statusCode !== 409) throw error;
      }
      try {
        // Young again: a sweeper that has just looked at it finds its condition not met.
        await target.setMetadata({ seen: new Date().toISOString() });
        return true;
      } catch (error) {
        // Swept between the two calls: copy it after all.
        if (!isMissing(error)) throw error;
      }
    }
  }
}

async function deleteIfOld(blob: BlockBlobClient, before: Date): Promise<boolean> {
  try {
    await blob.delete({ conditions: { ifUnmodifiedSince: before } });
    return true;
  } catch (error) {
    if (isMissing(error)) return true;
    if ((error as { statusCode?: number }).statusCode === 412) return false;
    throw error;
  }
}

function refusalOf(error: unknown): unknown {
  const { statusCode } = error as { statusCode?: unknown };
  return error instanceof RestError && typeof statusCode === 'number'
    ? new BlobRefused(statusCode, { cause: error })
    : error;
}

function isAbort(error: unknown): boolean {
  return (error as { name?: string }).name === 'AbortError';
}

/** Opens the store, making its container where it is missing. @throws when the store cannot be reached */
export async function createBlobStore(connectionString: string, container = CONTAINER): Promise<BlobStore> {
  const service = BlobServiceClient.fromConnectionString(connectionString, {
    retryOptions: {
      retryPolicyType: StorageRetryPolicyType.EXPONENTIAL,
      maxTries: 4,
      tryTimeoutInMs: 60_000,
      retryDelayInMs: 300,
      maxRetryDelayInMs: 5_000,
    },
  });
  const client = service.getContainerClient(container);
  await client.createIfNotExists();
  return new BlobStore(client);
}

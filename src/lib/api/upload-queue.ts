import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { newIdempotencyKey } from '#src/lib/api/client.ts';
import { upload, type UploadRequest } from '#src/lib/api/upload.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';

export type QueuedFile = {
  readonly id: number;
  readonly file: File;
  /** Of its upload, however often it is tried. */
  readonly key: string;
  readonly state: 'waiting' | 'sending' | 'stored' | 'duplicate' | 'failed';
  /** Bytes sent. */
  readonly sent: number;
  readonly problem: string | null;
  /** Of a duplicate: where the same bytes lie in this batch. */
  readonly already: UploadReply['files'][number]['already'];
  /** No answer came: it is sent again by itself once the network is back. */
  readonly offline: boolean;
  /** The file itself was not accepted: sending the same one again changes nothing. */
  readonly refused: boolean;
};

export type UploadTarget = {
  readonly path: string;
  readonly method: 'POST' | 'PUT';
  readonly field: string;
};

export type UploadQueue = {
  readonly add: (files: readonly File[]) => void;
  /** Sends again what failed on the way; what was refused stays refused. */
  readonly retry: () => void;
  /** Everything goes from the list but what is still to be sent. */
  readonly clear: () => void;
  readonly stop: () => void;
  readonly files: () => readonly QueuedFile[];
  readonly subscribe: (listener: () => void) => () => void;
  /** Told of each file that was stored. */
  readonly onStored: (listener: () => void) => () => void;
};

export type SendFile = (request: UploadRequest) => Promise<UploadReply>;

/** Two at a time: one waits for the server while the other uses the line. */
const AT_ONCE = 2;

/** Answers about the file: empty or malformed, too large, of another kind, not what it says. */
const REFUSED: ReadonlySet<number> = new Set([400, 413, 415, 422]);

/**
 * Sends many files one request each, so that a refusal or a lost connection costs one file. Lives outside the page
 * that shows it: going to another page does not stop it.
 */
export function createUploadQueue(target: UploadTarget, sendFile: SendFile = upload): UploadQueue {
  let files: readonly QueuedFile[] = [];
  let nextId = 1;
  let running = 0;
  const abort = new AbortController();
  const listeners = new Set<() => void>();
  const storedListeners = new Set<() => void>();

  function put(next: readonly QueuedFile[]): void {
    files = next;
    for (const listener of listeners) listener();
  }
  function patch(id: number, change: Partial<QueuedFile>): void {
    put(files.map((one) => (one.id === id ? { ...one, ...change } : one)));
  }

  async function send({ id, file, key }: QueuedFile): Promise<void> {
    patch(id, { state: 'sending', sent: 0, problem: null, offline: false, refused: false });
    try {
      const reply = await sendFile({
        ...target,
        files: [file],
        idempotencyKey: key,
        signal: abort.signal,
        onProgress: (sent) => patch(id, { sent }),
      });
      const answer = reply.files[0];
      if (answer?.error) return patch(id, { state: 'failed', problem: answer.error.detail, refused: true });
      const already = answer?.already ?? null;
      const duplicate = already !== null;
      patch(id, { state: duplicate ? 'duplicate' : 'stored', sent: file.size, already });
      if (!duplicate) for (const listener of storedListeners) listener();
    } catch (error) {
      if (abort.signal.aborted) return;
      const problem = error instanceof ApiProblem ? error : null;
      patch(id, {
        state: 'failed',
        problem: problem?.message ?? 'It could not be sent. Try again.',
        offline: problem?.status === 0,
        refused: problem !== null && REFUSED.has(problem.status),
      });
    }
  }

  async function work(): Promise<void> {
    running += 1;
    for (let one = nextWaiting(); one && !abort.signal.aborted; one = nextWaiting()) await send(one);
    running -= 1;
  }
  const nextWaiting = (): QueuedFile | undefined => files.find((one) => one.state === 'waiting');
  function run(): void {
    while (running < AT_ONCE && nextWaiting()) void work();
  }
  function again(which: (one: QueuedFile) => boolean): void {
    put(files.map((one) => (one.state === 'failed' && which(one) ? { ...one, state: 'waiting' } : one)));
    run();
  }

  const onOnline = () => again((one) => one.offline);
  globalThis.addEventListener('online', onOnline);
  return {
    add(chosen) {
      const added = chosen.map((file): QueuedFile => {
        const id = nextId;
        nextId += 1;
        return {
          id,
          file,
          key: newIdempotencyKey(),
          state: 'waiting',
          sent: 0,
          problem: null,
          already: null,
          offline: false,
          refused: false,
        };
      });
      put([...files, ...added]);
      run();
    },
    retry: () => again((one) => !one.refused),
    clear: () => put(files.filter((one) => one.state === 'waiting' || one.state === 'sending')),
    stop() {
      abort.abort();
      globalThis.removeEventListener('online', onOnline);
    },
    files: () => files,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    onStored(listener) {
      storedListeners.add(listener);
      return () => storedListeners.delete(listener);
    },
  };
}

export type UploadCounts = {
  readonly all: number;
  readonly stored: number;
  readonly duplicate: number;
  /** Refused or lost on the way. */
  readonly failed: number;
  readonly refused: number;
  readonly busy: boolean;
};

export function countUploads(files: readonly QueuedFile[]): UploadCounts {
  const of = (state: QueuedFile['state']) => files.filter((one) => one.state === state).length;
  return {
    all: files.length,
    stored: of('stored'),
    duplicate: of('duplicate'),
    failed: of('failed'),
    refused: files.filter((one) => one.state === 'failed' && one.refused).length,
    busy: of('waiting') + of('sending') > 0,
  };
}

import { useCallback, useEffect, useRef, useState } from 'react';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { upload } from '#src/lib/api/upload.ts';

export type QueuedFile = {
  readonly id: number;
  readonly file: File;
  readonly state: 'waiting' | 'sending' | 'stored' | 'failed';
  /** Bytes sent. */
  readonly sent: number;
  readonly problem: string | null;
};

/** What the server says of an upload; `error` is written for people. */
export type UploadReply = {
  readonly input: number;
  readonly files: readonly {
    readonly id: string | null;
    readonly fileName: string;
    readonly sha256: string | null;
    readonly error: string | null;
  }[];
};

type Target = { readonly path: string; readonly method: 'POST' | 'PUT'; readonly field: string };

/** Two at a time: one waits for the server while the other uses the line. */
const AT_ONCE = 2;

/** Sends many files one request each, so that one refusal or a lost connection costs one file; failed ones can be tried again. */
export function useUploadQueue(target: Target, onStored?: (reply: UploadReply, file: File) => void) {
  const [files, setFiles] = useState<readonly QueuedFile[]>([]);
  const nextId = useRef(1);
  const abort = useRef<AbortController | null>(null);
  const stored = useRef(onStored);
  useEffect(() => {
    stored.current = onStored;
  });
  useEffect(() => () => abort.current?.abort(), []);

  const patch = useCallback((id: number, change: Partial<QueuedFile>) => {
    setFiles((all) => all.map((one) => (one.id === id ? { ...one, ...change } : one)));
  }, []);

  const { path, method, field } = target;
  const run = useCallback(
    async (queued: readonly QueuedFile[]) => {
      const waiting = [...queued];
      abort.current ??= new AbortController();
      const signal = abort.current.signal;
      async function worker(): Promise<void> {
        for (let one = waiting.shift(); one && !signal.aborted; one = waiting.shift()) {
          const { id, file } = one;
          patch(id, { state: 'sending', sent: 0, problem: null });
          try {
            const reply = await upload<UploadReply>({
              path,
              method,
              field,
              files: [file],
              signal,
              onProgress: (sent) => patch(id, { sent }),
            });
            const refused = reply.files.find((answer) => answer.error !== null)?.error;
            if (refused) {
              patch(id, { state: 'failed', problem: refused });
            } else {
              patch(id, { state: 'stored', sent: file.size });
              stored.current?.(reply, file);
            }
          } catch (error) {
            if (signal.aborted) return;
            const problem = error instanceof ApiProblem ? error.message : 'It could not be sent. Try again.';
            patch(id, { state: 'failed', problem });
          }
        }
      }
      await Promise.all(Array.from({ length: AT_ONCE }, worker));
    },
    [path, method, field, patch],
  );

  const add = useCallback(
    (chosen: readonly File[]) => {
      const queued = chosen.map((file): QueuedFile => {
        const id = nextId.current;
        nextId.current += 1;
        return { id, file, state: 'waiting', sent: 0, problem: null };
      });
      setFiles((all) => [...all, ...queued]);
      void run(queued);
    },
    [run],
  );

  return {
    files,
    add,
    retry: () => void run(files.filter((one) => one.state === 'failed')),
    clearStored: () => setFiles((all) => all.filter((one) => one.state !== 'stored')),
    counts: {
      all: files.length,
      stored: files.filter((one) => one.state === 'stored').length,
      failed: files.filter((one) => one.state === 'failed').length,
    },
  };
}

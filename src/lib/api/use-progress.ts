import { useEffect, useRef, useState } from 'react';

export type JobProgress = {
  readonly state: 'queued' | 'running' | 'done' | 'failed' | 'issued';
  readonly done: number;
  /** Null: not known yet. */
  readonly total: number | null;
  /** Written for people. */
  readonly problem?: unknown;
};

const POLL_MS = 2_000;
const PATIENCE_MS = 6_000;

/** Neither queued nor running: it will not change any more. */
export function isFinal(progress: JobProgress): boolean {
  return progress.state !== 'queued' && progress.state !== 'running';
}

/**
 * Follows a long action by server-sent events. Where those do not get through (a proxy that buffers,
 * a connection that keeps breaking) it asks by `poll` instead. `subject` null: nothing to follow.
 */
export function useProgress(
  subject: string | null,
  options: {
    readonly poll: () => Promise<JobProgress>;
    readonly onFinal?: (progress: JobProgress) => void;
    /** Another number: the same subject is at work anew. */
    readonly turn?: number;
  },
): JobProgress | null {
  const { turn = 0 } = options;
  const [seen, setSeen] = useState<{ subject: string; turn: number; progress: JobProgress } | null>(null);
  const current = useRef(options);
  useEffect(() => {
    current.current = options;
  });
  useEffect(() => {
    if (subject === null) return undefined;
    const following = follow(subject, {
      poll: () => current.current.poll(),
      onProgress: (progress) => {
        setSeen({ subject, turn, progress });
        if (isFinal(progress)) current.current.onFinal?.(progress);
      },
    });
    return following;
  }, [subject, turn]);
  return seen && seen.subject === subject && seen.turn === turn ? seen.progress : null;
}

type Following = {
  readonly poll: () => Promise<JobProgress>;
  readonly onProgress: (progress: JobProgress) => void;
};

function follow(subject: string, { poll, onProgress }: Following): () => void {
  let over = false;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const source = new EventSource(`/api/events?subject=${encodeURIComponent(subject)}`);

  function take(progress: JobProgress): void {
    if (over) return;
    onProgress(progress);
    if (isFinal(progress)) stop();
  }
  function stop(): void {
    over = true;
    clearTimeout(timer);
    source.close();
  }
  async function ask(): Promise<void> {
    try {
      take(await poll());
    } catch {
      // A missed answer is not the end: the next one tells the same.
    }
    if (!over) wait(POLL_MS);
  }
  function wait(ms: number): void {
    clearTimeout(timer);
    timer = setTimeout(() => void ask(), ms);
  }

  source.addEventListener('message', (event: MessageEvent<string>) => {
    take(JSON.parse(event.data) as JobProgress);
    if (!over) wait(PATIENCE_MS);
  });
  source.addEventListener('error', () => wait(POLL_MS));
  wait(PATIENCE_MS);
  return stop;
}

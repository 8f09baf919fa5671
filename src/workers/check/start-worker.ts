import type { FromCheckWorker, ToCheckWorker } from './protocol.ts';

export type CheckWorker = {
  readonly ask: (message: ToCheckWorker) => void;
  /** Whatever it was doing is given up. */
  readonly end: () => void;
};

/** Starts the check beside the page; `hear` is told what it says, and of its own end as a fault. */
export function startCheckWorker(hear: (message: FromCheckWorker) => void): CheckWorker {
  const worker = new Worker(new URL('./check.worker.ts', import.meta.url), { type: 'module' });
  worker.addEventListener('message', ({ data }: MessageEvent<FromCheckWorker>) => hear(data));
  worker.addEventListener('error', (event) =>
    hear({ type: 'fault', detail: event.message || 'The check could not be started.' }),
  );
  return {
    // A worker has no origin to name: the rule speaks of windows.
    // oxlint-disable-next-line unicorn/require-post-message-target-origin
    ask: (message) => worker.postMessage(message),
    end: () => worker.terminate(),
  };
}

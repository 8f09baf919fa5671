import { startChild } from '#server/children/start-child.ts';
import { residentMemory } from '#server/workbook/resident-memory.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type {
  LoadedInputs,
  CheckSummary,
  FromCheck,
  RowsDocument,
  SourceNeeds,
  ToCheck,
} from './check-messages.ts';

const HEAP_MB = 640;
/** Buffers are outside the heap limit. */
const MEMORY_BYTES = 800_000_000;
/** Until the workbook is read; the job itself has a limit on the whole. */
const READ_MS = 30_000;
const WATCH_EVERY_MS = 50;
/** Rows of a list in one message to the process. */
const SLICE = 2_000;

/** How a process ends whose heap is full: by SIGABRT, or by what a shell makes of it. */
const ABORTED = 134;

export type CheckProcess = {
  /** Reads the workbook. @throws WorkbookRefused */
  readonly needs: () => Promise<SourceNeeds>;
  /** @throws WorkbookRefused when it needs too much memory */
  readonly compute: (inputs: LoadedInputs) => Promise<CheckSummary>;
  /** The rows, each document made while the one before is stored. */
  readonly documents: () => AsyncGenerator<RowsDocument>;
  /** Ends it, wherever it is. */
  readonly end: () => void;
};

/** Why a process said nothing more: over the workbook, or over what we made of it. */
function endedEarly({ full, read }: { full: boolean; read: boolean }): Error {
  if (full) return new WorkbookRefused('reader-memory');
  return read ? new Error('The check ended before it was done.') : new WorkbookRefused('reader-failed');
}

/**
 * Reads and checks a workbook in a process of its own, so that the server answers others meanwhile and its memory does
 * not grow with the workbook. Rows cross one document at a time.
 */
export function startCheckProcess(path: string, signal: AbortSignal): CheckProcess {
  const child = startChild('check', {
    args: [path],
    // A young generation as large as the work: most of what is read lives until the end, and was copied over and over.
    flags: [`--max-old-space-size=${HEAP_MB}`, '--max-semi-space-size=32'],
    serialization: 'advanced',
  });
  const arrived: FromCheck[] = [];
  let wake: (() => void) | null = null;
  let failure: Error | null = null;
  let read = false;
  const fail = (error: Error): void => {
    failure ??= error;
    child.kill('SIGKILL');
    wake?.();
  };
  const timer = setTimeout(
    () => fail(new WorkbookRefused('reader-time', { seconds: READ_MS / 1000 })),
    READ_MS,
  );
  const watch = setInterval(() => {
    if (child.pid === undefined) return;
    void residentMemory(child.pid).then((bytes) => {
      if (bytes !== null && bytes > MEMORY_BYTES) fail(new WorkbookRefused('reader-memory'));
    });
  }, WATCH_EVERY_MS);
  const aborted = (): void => fail(signal.reason as Error);
  signal.addEventListener('abort', aborted);
  child.on('message', (message: FromCheck) => {
    arrived.push(message);
    wake?.();
  });
  child.on('error', fail);
  child.on('close', (code, killedBy) => {
    clearTimeout(timer);
    clearInterval(watch);
    signal.removeEventListener('abort', aborted);
    failure ??= endedEarly({ full: killedBy === 'SIGABRT' || code === ABORTED, read });
    wake?.();
  });
  if (signal.aborted) aborted();

  const next = async (): Promise<FromCheck> => {
    for (;;) {
      const message = arrived.shift();
      if (message?.type === 'refused') throw new WorkbookRefused(message.code, message.params);
      if (message?.type === 'fault')
        throw read ? new Error(message.stack) : new WorkbookRefused('reader-failed');
      if (message !== undefined) return message;
      if (failure !== null) throw failure;
      await new Promise<void>((resolve) => (wake = resolve));
    }
  };
  const send = (message: ToCheck): Promise<void> =>
    new Promise((resolve, reject) => {
      child.send(message, (error) => (error ? reject(failure ?? error) : resolve()));
    });
  const expect = async <T extends FromCheck['type']>(type: T): Promise<Extract<FromCheck, { type: T }>> => {
    const message = await next();
    if (message.type !== type) throw new Error(`The check said ${message.type}, not ${type}.`);
    return message as Extract<FromCheck, { type: T }>;
  };

  return {
    needs: async () => {
      const { needs } = await expect('needs');
      clearTimeout(timer);
      read = true;
      return needs;
    },
    compute: async ({ frame, lists, photos }) => {
      for await (const rows of photos) await send({ type: 'list', name: 'photos', rows });
      for (const name of Object.keys(lists) as (keyof typeof lists)[])
        for (let at = 0; at < lists[name].length; at += SLICE)
          await send({ type: 'list', name, rows: lists[name].slice(at, at + SLICE) });
      await send({ type: 'frame', frame });
      return (await expect('summary')).summary;
    },
    documents: async function* documents() {
      await send({ type: 'next' });
      for (;;) {
        const message = await next();
        if (message.type === 'done') return;
        if (message.type !== 'rows') throw new Error(`The check said ${message.type}, not rows.`);
        await send({ type: 'next' });
        yield message.document;
      }
    },
    end: () => child.kill('SIGKILL'),
  };
}

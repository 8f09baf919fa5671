import { open } from 'node:fs/promises';
import { startChild } from '#server/children/start-child.ts';
import { checkFileSize } from '#shared/workbook/preflight.ts';
import type { Workbook } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { createCollector } from '#shared/workbook/xml/collect-workbook.ts';
import { unpackRow } from './pack-rows.ts';
import type { ReaderMessage } from './reader-messages.ts';
import { residentMemory } from './resident-memory.ts';
import { createSlots } from './slots.ts';

export type ReadOptions = {
  readonly timeLimitMs?: number;
  /** Resident memory at which the reading process is ended; buffers are outside the heap limit. */
  readonly memoryLimitBytes?: number;
  /** Heap of the reading process. */
  readonly heapLimitMb?: number;
};

const WATCH_EVERY_MS = 50;
/** How a process ends whose heap is full: by SIGABRT, or by what a shell makes of it. */
const ABORTED = 134;
const inSlot = createSlots(2);

function readInChild(
  path: string,
  { timeLimitMs = 30_000, memoryLimitBytes = 400_000_000, heapLimitMb = 256 }: ReadOptions,
): Promise<Workbook> {
  return new Promise((resolve, reject) => {
    const child = startChild('reader', { args: [path], flags: [`--max-old-space-size=${heapLimitMb}`] });
    const collector = createCollector();
    let verdict: WorkbookRefused | null = null;
    let done = false;
    const end = (refused: WorkbookRefused): void => {
      verdict ??= refused;
      child.kill('SIGKILL');
    };
    const timer = setTimeout(
      () => end(new WorkbookRefused('reader-time', { seconds: timeLimitMs / 1000 })),
      timeLimitMs,
    );
    const watch = setInterval(() => {
      if (child.pid === undefined) return;
      void residentMemory(child.pid).then((bytes) => {
        if (bytes !== null && bytes > memoryLimitBytes) end(new WorkbookRefused('reader-memory'));
      });
    }, WATCH_EVERY_MS);
    const receive = (message: ReaderMessage): void => {
      if (message.type === 'rows') {
        collector.add({ type: 'rows', sheet: message.sheet, rows: message.rows.map(unpackRow) });
      } else if (message.type === 'event') collector.add(message.event);
      else if (message.type === 'done') done = true;
      else verdict ??= new WorkbookRefused(message.code, message.params);
    };
    child.on('message', (message: ReaderMessage) => {
      try {
        receive(message);
      } catch {
        // Thrown here, it would end this process instead of that one.
        end(new WorkbookRefused('reader-failed'));
      }
    });
    child.on('error', () => end(new WorkbookRefused('reader-failed')));
    child.on('close', (code, signal) => {
      clearTimeout(timer);
      clearInterval(watch);
      if (verdict !== null) reject(verdict);
      else if (!done) {
        const full = signal === 'SIGABRT' || code === ABORTED;
        reject(new WorkbookRefused(full ? 'reader-memory' : 'reader-failed'));
      } else {
        try {
          resolve(collector.finish());
        } catch (error) {
          reject(error as Error);
        }
      }
    });
  });
}

/** Refuses by size before a process is started; an unreadable path throws the system's own error. */
async function checkSize(path: string): Promise<void> {
  const file = await open(path);
  try {
    const { size } = await file.stat();
    checkFileSize(size);
  } finally {
    await file.close();
  }
}

/**
 * Reads a workbook of unknown origin in a process of its own, at most two at once, with limits on time and memory.
 * Throws WorkbookRefused (code and parameters; sentence by shared/workbook/refusal-text.ts).
 */
export async function readWorkbookFile(path: string, options: ReadOptions = {}): Promise<Workbook> {
  await checkSize(path);
  return inSlot(() => readInChild(path, options));
}

import { readFile } from 'node:fs/promises';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { CheckFrame, ContextLists, FromCheck, ListName, ToCheck } from './check-messages.ts';
import { computeCheck, type ComputedCheck } from './compute-check.ts';
import { sourceNeeds } from './source-needs.ts';

/** Resolves when the message has been handed over. */
function send(message: FromCheck): Promise<void> {
  return new Promise((resolve, reject) => {
    process.send!(message, (error: Error | null) => (error ? reject(error) : resolve()));
  });
}

/** What was sent, in its order; the server speaks only when it was asked. */
function listen(): () => Promise<ToCheck> {
  const arrived: ToCheck[] = [];
  let wake: (() => void) | null = null;
  process.on('message', (message: ToCheck) => {
    arrived.push(message);
    wake?.();
  });
  return async () => {
    for (;;) {
      const next = arrived.shift();
      if (next !== undefined) return next;
      await new Promise<void>((resolve) => (wake = resolve));
    }
  };
}

async function receiveInputs(
  next: () => Promise<ToCheck>,
): Promise<{ frame: CheckFrame; lists: ContextLists }> {
  const lists: Record<ListName, unknown[]> = { photos: [], lines: [], design: [], previous: [] };
  for (;;) {
    const message = await next();
    if (message.type === 'list') for (const row of message.rows) lists[message.name].push(row);
    // The sender's types are those of ContextLists; a message only cannot carry them slice by slice.
    if (message.type === 'frame') return { frame: message.frame, lists: lists as unknown as ContextLists };
  }
}

/** In a function of its own: the cells, and then the source rows, are let go as soon as they are read. */
async function compute(path: string, next: () => Promise<ToCheck>): Promise<ComputedCheck> {
  const source = readSource(await readWorkbookBytes(await readFile(path)));
  await send({ type: 'needs', needs: sourceNeeds(source) });
  return computeCheck(source, await receiveInputs(next));
}

// Whoever asked is gone, killed perhaps: nobody waits for the answer.
process.on('disconnect', () => process.exit(1));
try {
  const next = listen();
  const { summary, documents } = await compute(process.argv[2] ?? '', next);
  await send({ type: 'summary', summary });
  for (const document of documents()) {
    await next();
    await send({ type: 'rows', document });
  }
  await next();
  await send({ type: 'done' });
} catch (error) {
  await send(
    error instanceof WorkbookRefused
      ? { type: 'refused', code: error.code, params: error.params }
      : { type: 'fault', stack: error instanceof Error ? (error.stack ?? error.message) : String(error) },
  );
}
process.removeAllListeners('disconnect');
process.disconnect();

import type { Page } from 'playwright-core';
import type { CheckedLine, FromCheckWorker } from '#src/workers/check/protocol.ts';
import type { OrderContextData } from '#shared/check/context-from-data.ts';

export type BrowserCheck = {
  readonly lines: readonly CheckedLine[];
  readonly end: Extract<FromCheckWorker, { type: 'done' | 'refused' | 'fault' }>;
};

/** The worker that the built page itself has started. */
export async function workerUrl(page: Page): Promise<string> {
  const worker = page.workers()[0] ?? (await page.waitForEvent('worker'));
  return worker.url();
}

/** Checks these bytes on the page by the product's own worker, in the messages that the product's own screen sends. */
export function checkInBrowser(
  page: Page,
  asked: { readonly url: string; readonly bytes: Buffer; readonly context: OrderContextData },
): Promise<BrowserCheck> {
  return page.evaluate(
    ({ url, base64, context }) =>
      new Promise<BrowserCheck>((resolve, reject) => {
        const lines: CheckedLine[] = [];
        const worker = new Worker(url, { type: 'module' });
        worker.addEventListener('error', (event) => reject(new Error(event.message)));
        worker.addEventListener('message', ({ data }: MessageEvent<FromCheckWorker>) => {
          if (data.type === 'lines') lines.push(...data.lines);
          if (data.type === 'done' || data.type === 'refused' || data.type === 'fault') {
            worker.terminate();
            resolve({ lines, end: data });
          }
        });
        const bytes = Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0));
        // oxlint-disable-next-line unicorn/require-post-message-target-origin
        worker.postMessage({ type: 'workbook', file: new File([bytes], 'batch.xlsx'), context });
      }),
    { url: asked.url, base64: asked.bytes.toString('base64'), context: asked.context },
  );
}

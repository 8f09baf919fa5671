import type { Page } from 'playwright-core';

export type DroppedFile = { readonly name: string; readonly type: string; readonly bytes: Buffer };

/** Drags files over the page and lets go. */
export async function dropFiles(page: Page, files: readonly DroppedFile[]): Promise<void> {
  const carried = await page.evaluateHandle(
    (list) => {
      const transfer = new DataTransfer();
      for (const { name, type, base64 } of list) {
        const bytes = Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0));
        transfer.items.add(new File([bytes], name, { type }));
      }
      return transfer;
    },
    files.map(({ name, type, bytes }) => ({ name, type, base64: bytes.toString('base64') })),
  );
  for (const event of ['dragenter', 'dragover', 'drop'])
    await page.dispatchEvent('main', event, { dataTransfer: carried });
}

export const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

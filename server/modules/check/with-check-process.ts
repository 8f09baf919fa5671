import { join } from 'node:path';
import type { BlobStore } from '#server/storage/blob-store.ts';
import { withTempFolder } from '#server/uploads/temp-folder.ts';
import { createSlots } from '#server/workbook/slots.ts';
import { startCheckProcess, type CheckProcess } from './check-process.ts';

const inSlot = createSlots(2);

/**
 * A process that checks a workbook of the blob store, by way of a file of its own; both are gone when the task ends. At
 * most two at once.
 * @throws WorkbookRefused; BlobMissing
 */
export function withCheckProcess<T>(
  stored: { blobs: BlobStore; sha256: string; signal: AbortSignal },
  task: (checking: CheckProcess) => Promise<T>,
): Promise<T> {
  const { blobs, sha256, signal } = stored;
  return inSlot(() =>
    withTempFolder('upstand-check-', async (folder) => {
      const path = join(folder, 'workbook.xlsx');
      await blobs.readTo(sha256, path, { signal });
      const checking = startCheckProcess(path, signal);
      try {
        return await task(checking);
      } finally {
        checking.end();
      }
    }),
  );
}

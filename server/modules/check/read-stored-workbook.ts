import { join } from 'node:path';
import type { BlobStore } from '#server/storage/blob-store.ts';
import { withTempFolder } from '#server/uploads/temp-folder.ts';
import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import type { Workbook } from '#shared/workbook/types.ts';

/**
 * Reads a workbook out of the blob store by way of a file of its own, which is gone when this ends.
 * @throws WorkbookRefused; BlobMissing
 */
export async function readStoredWorkbook(
  blobs: BlobStore,
  sha256: string,
  signal: AbortSignal,
): Promise<Workbook> {
  return withTempFolder('upstand-check-', async (folder) => {
    const path = join(folder, 'workbook.xlsx');
    await blobs.readTo(sha256, path, { signal });
    return readWorkbookFile(path);
  });
}

import type { Workbook } from './types.ts';
import { openZipBlob } from './open-zip-blob.ts';
import { preflightBlob } from './preflight.ts';
import { createCollector } from './xml/collect-workbook.ts';
import { readPackage } from './xml/read-package.ts';

/** Reads a workbook where there is no server: the same refusals, cells and limits. `progress` hears of rows as they are read. Throws WorkbookRefused. */
export async function readWorkbookBlob(
  file: Blob,
  progress: (rows: number) => void = () => undefined,
): Promise<Workbook> {
  await preflightBlob(file);
  const source = await openZipBlob(file);
  const collector = createCollector();
  let rows = 0;
  for await (const event of readPackage(source)) {
    if (event.type === 'rows') progress((rows += event.rows.length));
    collector.add(event);
  }
  return collector.finish();
}

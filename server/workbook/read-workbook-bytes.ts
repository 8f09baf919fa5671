import { preflight } from '#shared/workbook/preflight.ts';
import type { Workbook } from '#shared/workbook/types.ts';
import { createCollector } from '#shared/workbook/xml/collect-workbook.ts';
import { readPackage, type WorkbookEvent } from '#shared/workbook/xml/read-package.ts';
import { openZipSource } from './zip-source.ts';

/** The reader's events for a file in memory. Throws WorkbookRefused. */
export async function* readWorkbookEvents(bytes: Buffer): AsyncGenerator<WorkbookEvent> {
  preflight(bytes);
  const source = await openZipSource(bytes);
  try {
    yield* readPackage(source);
  } finally {
    source.close();
  }
}

/** Reads a workbook in this process: for tests and the command line. The server reads strangers' files with readWorkbookFile. Throws WorkbookRefused. */
export async function readWorkbookBytes(bytes: Buffer): Promise<Workbook> {
  const collector = createCollector();
  for await (const event of readWorkbookEvents(bytes)) collector.add(event);
  return collector.finish();
}

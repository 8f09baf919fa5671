import { readFile } from 'node:fs/promises';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { packRow, type PackedRow } from './pack-rows.ts';
import type { ReaderMessage } from './reader-messages.ts';
import { readWorkbookEvents } from './read-workbook-bytes.ts';

/** Cells in one message: large enough to be quick, small enough to keep memory flat. */
const CELLS_A_MESSAGE = 4_000;

/** Resolves when the message has been handed over, so that a slow receiver slows the reading. */
function send(message: ReaderMessage): Promise<void> {
  return new Promise((resolve, reject) => {
    process.send!(message, (error: Error | null) => (error ? reject(error) : resolve()));
  });
}

async function readAndSend(path: string): Promise<void> {
  let rows: PackedRow[] = [];
  let cells = 0;
  let sheet = 0;
  const flush = async (): Promise<void> => {
    if (rows.length > 0) await send({ type: 'rows', sheet, rows });
    rows = [];
    cells = 0;
  };
  for await (const event of readWorkbookEvents(await readFile(path))) {
    if (event.type !== 'rows') {
      await flush();
      await send({ type: 'event', event });
      continue;
    }
    if (event.sheet !== sheet) await flush();
    sheet = event.sheet;
    for (const row of event.rows) {
      rows.push(packRow(row));
      cells += row.cells.length;
      if (cells >= CELLS_A_MESSAGE) await flush();
    }
  }
  await flush();
}

try {
  await readAndSend(process.argv[2] ?? '');
  await send({ type: 'done' });
} catch (error) {
  if (!(error instanceof WorkbookRefused)) throw error;
  await send({ type: 'refused', code: error.code, params: error.params });
}
process.disconnect();

import { checkBeforeHandIn } from '#shared/check/check-before-hand-in.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { readWorkbookBlob } from '#shared/workbook/read-workbook-blob.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { typedWorkbook } from '#shared/workbook/typed-workbook.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { checkedLines } from './checked-lines.ts';
import type { FromCheckWorker, ToCheckWorker } from './protocol.ts';

/** The types of a page and of a worker cannot be loaded side by side: this is all that is used of the latter. */
type Port = {
  postMessage(message: FromCheckWorker): void;
  addEventListener(type: 'message', listen: (event: { readonly data: ToCheckWorker }) => void): void;
};
const port = globalThis as unknown as Port;

/** Small enough that taking one over holds no page up. */
const LINES_A_MESSAGE = 200;
const ROWS_A_REPORT = 500;

async function checkWorkbook({ file, context }: Extract<ToCheckWorker, { type: 'workbook' }>): Promise<void> {
  let told = 0;
  const workbook = await readWorkbookBlob(file, (rows) => {
    if (rows - told < ROWS_A_REPORT) return;
    told = rows;
    port.postMessage({ type: 'rows-read', rows });
  });
  const source = readSource(workbook);
  port.postMessage({ type: 'lines-read', lines: source.lines.length });
  const { lines, loose, notRun } = checkedLines(checkBeforeHandIn(source, context));
  for (let at = 0; at < lines.length; at += LINES_A_MESSAGE)
    port.postMessage({ type: 'lines', lines: lines.slice(at, at + LINES_A_MESSAGE) });
  port.postMessage({ type: 'done', loose, notRun });
}

function checkTyped({ turn, line, context }: Extract<ToCheckWorker, { type: 'typed' }>): void {
  const source = readSource(typedWorkbook(line));
  const { lines, loose, notRun } = checkedLines(checkBeforeHandIn(source, context));
  port.postMessage({ type: 'typed', turn, line: lines[0] ?? null, loose, notRun });
}

async function answer(asked: ToCheckWorker): Promise<void> {
  try {
    if (asked.type === 'workbook') await checkWorkbook(asked);
    else checkTyped(asked);
  } catch (error) {
    if (error instanceof WorkbookRefused) {
      const { code, params } = error;
      port.postMessage({ type: 'refused', code, params, detail: refusalText(error) });
    } else {
      port.postMessage({ type: 'fault', detail: error instanceof Error ? error.message : String(error) });
    }
  }
}

port.addEventListener('message', ({ data }) => void answer(data));

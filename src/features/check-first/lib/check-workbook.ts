import type { ShownFinding } from '#shared/check/shown-finding.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';
import type { CheckedLine, NotRun } from '#src/workers/check/protocol.ts';
import { startCheckWorker } from '#src/workers/check/start-worker.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';

export type WorkbookResult = {
  readonly lines: readonly CheckedLine[];
  readonly loose: readonly ShownFinding[];
  readonly notRun: readonly NotRun[];
};

export type WorkbookCheckState =
  /** `lines` 0: the file is still being read. */
  | { readonly phase: 'running'; readonly rows: number; readonly done: number; readonly lines: number }
  | { readonly phase: 'done'; readonly result: WorkbookResult }
  | { readonly phase: 'refused'; readonly detail: string }
  | { readonly phase: 'failed'; readonly detail: string };

/** As long as the server gives its own reader, and as long again for the rules. */
const LIMIT_MS = 30_000;
const TOO_LONG =
  'The rules took longer on this device than half a minute and were stopped. Hand the workbook in: the server checks it.';

/** Checks a file beside the page. Nothing of it leaves the browser. Gives back how to stop. */
export function checkWorkbook(
  { file, context }: { readonly file: File; readonly context: CheckContextData },
  onState: (state: WorkbookCheckState) => void,
): () => void {
  const lines: CheckedLine[] = [];
  let rows = 0;
  let expected = 0;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const finish = (state: WorkbookCheckState): void => {
    stop();
    onState(state);
  };
  const running = (): void => onState({ phase: 'running', rows, done: lines.length, lines: expected });
  const worker = startCheckWorker((message) => {
    switch (message.type) {
      case 'rows-read':
        rows = message.rows;
        return running();
      case 'lines-read':
        expected = message.lines;
        limit({ phase: 'failed', detail: TOO_LONG });
        return running();
      case 'lines':
        for (const line of message.lines) lines.push(line);
        return running();
      case 'done':
        return finish({
          phase: 'done',
          result: { lines, loose: message.loose, notRun: message.notRun },
        });
      case 'refused':
        return finish({ phase: 'refused', detail: message.detail });
      case 'fault':
        return finish({ phase: 'failed', detail: message.detail });
      case 'typed':
        return undefined;
    }
  });
  function limit(over: WorkbookCheckState): void {
    clearTimeout(timer);
    timer = setTimeout(() => finish(over), LIMIT_MS);
  }
  function stop(): void {
    clearTimeout(timer);
    worker.end();
  }
  limit({
    phase: 'refused',
    detail: refusalText({ code: 'reader-time', params: { seconds: LIMIT_MS / 1000 } }),
  });
  running();
  worker.ask({ type: 'workbook', file, context });
  return stop;
}

import { useQueryClient } from '@tanstack/react-query';
import { checkContextQuery } from '../api/check-context.ts';
import { FileRows } from './file-rows.tsx';
import { HandInRow } from './hand-in-row.tsx';
import { NotRun } from './not-run.tsx';
import { ResultLines } from './result-lines.tsx';
import { wantsLook } from '../lib/result-view.ts';
import { useWorkbookCheck } from '../lib/use-workbook-check.ts';
import { useFileDrop } from '#src/features/batches/components/use-file-drop.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import type { CheckContextData, WorkOrder } from '#shared/generated/api-types.ts';

type Props = { readonly order: WorkOrder; readonly context: CheckContextData; readonly mayHandIn: boolean };

/** A workbook checked here, before anything is uploaded. */
export function WorkbookPanel({ order, context, mayHandIn }: Props) {
  const client = useQueryClient();
  // Asked anew for each file: a lot may have been held, a standard published, since the page was opened.
  const check = useWorkbookCheck(() => client.fetchQuery(checkContextQuery(order.id)));
  const over = useFileDrop(([file]) => file && check.take(file));
  const result = check.state?.phase === 'done' ? check.state.result : null;
  const clean = result !== null && result.loose.length === 0 && !result.lines.some(wantsLook);
  return (
    <div className="grid flex-1 content-start lg:grid-cols-[21rem_minmax(0,1fr)] lg:content-stretch">
      <aside aria-label="File and check" className="lg:sticky lg:top-band lg:self-start">
        <FileRows check={check} />
        {result && check.file && mayHandIn ? (
          <HandInRow order={order} file={check.file} clean={clean} />
        ) : null}
        {result ? <NotRun notRun={result.notRun} /> : null}
      </aside>
      <div className="min-h-[50dvh] min-w-0 border-hairline lg:border-l">
        {result ? (
          <ResultLines key={check.file?.name} result={result} context={context} />
        ) : (
          <EmptyState title="Check a workbook before you hand it in">
            The same rules run here, in your browser, on the owner’s standard. Nothing of the file is uploaded
            until you say so.
          </EmptyState>
        )}
      </div>
      {over ? (
        <div className="pointer-events-none fixed inset-3 z-40 flex items-center justify-center border-2 border-dashed border-accent bg-paper/90 text-title font-semibold">
          Let go: the workbook is checked here, and not uploaded
        </div>
      ) : null}
    </div>
  );
}

import { Cautions } from '#src/components/ui/caution.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import type { Batch } from '#shared/generated/api-types.ts';

/** A batch without lines: what to do, in order. */
export function FirstSteps({ batch }: { batch: Batch }) {
  if (!batch.can.includes('upload')) {
    return (
      <EmptyState title="Nothing was handed in yet">
        The contractor still works on this batch; what is handed in appears here.
      </EmptyState>
    );
  }
  if (batch.revision.number > 0) {
    return (
      <EmptyState title={`Revision ${batch.revision.number} waits for its workbook`}>
        Correct the lines that came back, in the workbook of the revision before or in a fresh template, and
        hand it in. Only those lines are taken; the approved ones stand as they are.
      </EmptyState>
    );
  }
  return (
    <>
      <EmptyState
        title="Hand in the workbook first"
        action={
          <a
            href={`/api/work-orders/${batch.workOrder.id}/template.xlsx`}
            download
            className="inline-flex min-h-8.5 items-center border border-ink px-3.5 text-table font-semibold hover:bg-sunk pointer-coarse:min-h-11"
          >
            Download the template of work order {batch.workOrder.number}
          </a>
        }
      >
        <ol className="list-decimal pl-5">
          <li>Fill in the template of the work order; its design values stand in it already.</li>
          <li>Drop it here or choose it. It is checked at once, and nobody but you sees the result.</li>
          <li>Add the photographs. One named “17-0426 bore-depth.jpg” finds its line by itself.</li>
          <li>Correct, or answer in writing, what the check found. Then submit.</li>
        </ol>
      </EmptyState>
      <div className="px-gutter pb-6">
        <Cautions />
      </div>
    </>
  );
}

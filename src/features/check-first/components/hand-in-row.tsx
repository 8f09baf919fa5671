import { useNavigate } from 'react-router-dom';
import { useHandIn } from '../lib/hand-in.ts';
import { IntakeRow } from '#src/features/batches/components/intake-row.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { paths } from '#src/config/paths.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

const KB = 1024;

/** The next step: the same file into a batch. */
export function HandInRow({ order, file, clean }: { order: WorkOrder; file: File; clean: boolean }) {
  const { handIn, sent } = useHandIn(order);
  const navigate = useNavigate();
  return (
    <IntakeRow glyph="dotted" title="Hand it in">
      <p>
        {order.openBatch
          ? 'It goes into the batch that is open. A workbook that is there already is kept, and this one takes its place.'
          : 'A batch is opened with this file in it; the photographs come next.'}
        {clean ? '' : ' You may hand it in as it is and correct it there.'}
      </p>
      <div className="mt-2">
        <Button
          kind="primary"
          busy={handIn.isPending ? 'Handing in' : false}
          onClick={() =>
            handIn.mutate(file, { onSuccess: (batchId) => void navigate(paths.batch.to(batchId)) })
          }
        >
          Hand it in
        </Button>
      </div>
      {sent ? (
        <Progress
          done={Math.round(sent.bytes / KB)}
          total={Math.max(1, Math.round(sent.total / KB))}
          things="kB sent"
          label="The workbook is being sent"
        />
      ) : null}
      {handIn.isError ? (
        <p role="alert" className="mt-1 text-nonconform">
          {handIn.error.message}
        </p>
      ) : null}
    </IntakeRow>
  );
}

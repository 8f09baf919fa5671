import type { CheckState } from '../api/use-check.ts';
import { useMoveBatch } from '../api/move-batch.ts';
import { IntakeRow } from './intake-row.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { problemCode } from '#src/lib/api/problem-text.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** The check of the newest upload: how far, or what it came to. */
export function CheckRow({ batch, check }: { batch: Batch; check: CheckState | null }) {
  const running = check?.state === 'queued' || check?.state === 'running';
  // A workbook that cannot be read ends the same way each time.
  const again = problemCode(check?.problem) === 'check.failed' && batch.can.includes('upload');
  return (
    <IntakeRow
      glyph={
        check?.state === 'failed'
          ? 'triangle'
          : batch.input > 0 && batch.counts.lines > 0 && !running
            ? 'tick'
            : 'dotted'
      }
      title="Check"
      settled={!running && check?.state !== 'failed'}
    >
      <div aria-live="polite">
        {running ? (
          <Progress
            done={check.done}
            total={check.total}
            things="rows checked"
            label={check.state === 'queued' ? 'Waits for its turn' : 'The workbook is being read'}
          />
        ) : (
          <p>{resultWords(batch, check)}</p>
        )}
        {running ? <p className="mt-1">It goes on when you leave this page.</p> : null}
        {again ? <CheckAgain batch={batch} /> : null}
      </div>
    </IntakeRow>
  );
}

function CheckAgain({ batch }: { batch: Batch }) {
  const move = useMoveBatch(batch);
  return (
    <p className="mt-1">
      <Button size="small" busy={move.isPending && 'Asking…'} onClick={() => move.mutate('recheck')}>
        Check again
      </Button>
      {move.isError ? <span className="ml-2 text-nonconform">{move.error.message}</span> : null}
    </p>
  );
}

function resultWords(batch: Batch, check: CheckState | null): string {
  if (check?.state === 'failed') return 'It ended without a result; see the workbook above.';
  // A later revision begins with the files of the one before, and none of its own to check.
  if (batch.input === 0) return 'Begins when the workbook is here.';
  const { lines } = batch.counts;
  if (lines === 0) {
    return batch.workbook.fileName
      ? 'No line was found in the workbook.'
      : 'Begins when the workbook is here.';
  }
  const { standards } = batch.revision;
  const on = standards.length > 0 ? `, on standard ${standards.join(' and ')}` : '';
  return `${counted(lines, 'line')} checked${on}`;
}

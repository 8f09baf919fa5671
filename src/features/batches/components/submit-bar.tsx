import { Button } from '#src/components/ui/button.tsx';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly onSubmit: () => void;
  readonly onWithdraw: () => void;
};

/** Always in sight: what stands, and the step that hands it in. */
export function SubmitBar({ batch, onSubmit, onWithdraw }: Props) {
  const { nonconformity, query } = batch.counts;
  const open = batch.can.includes('upload');
  const ready = batch.can.includes('submit');
  const withdraw = batch.can.includes('withdraw');
  if (!open && !withdraw) return null;
  return (
    <footer className="sticky bottom-0 z-10 mt-auto flex min-h-14 items-center justify-between gap-4 border-t-[1.5px] border-ink bg-sheet px-gutter py-2 print:hidden">
      <p className="text-table text-ink-2" aria-live="polite">
        {batch.counts.lines === 0 || batch.status === 'draft'
          ? 'Nothing to submit yet'
          : `${counted(nonconformity, 'nonconformity', 'nonconformities')}, ${counted(query, 'query', 'queries')}`}
      </p>
      {open ? (
        <Button size="large" kind={ready && nonconformity === 0 ? 'primary' : 'secondary'} onClick={onSubmit}>
          Submit…
        </Button>
      ) : null}
      {withdraw ? (
        <Button size="large" onClick={onWithdraw}>
          Withdraw…
        </Button>
      ) : null}
    </footer>
  );
}

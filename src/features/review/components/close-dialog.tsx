import { Button, ButtonLink } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { LINE_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { paths } from '#src/config/paths.ts';
import { undecidedOf, useCloseReview, type UndecidedLine } from '#src/features/review/api/close-review.ts';
import type { DeskCounts } from '#src/features/review/desk/desk-tabs.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch, RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly batch: Batch;
  readonly counts: DeskCounts;
  readonly lines: readonly RecordRow[];
  readonly openOfBatch: number;
  readonly onGo: (line: string) => void;
  readonly onClosed: () => void;
};

/** What closing the review will do, said before it is done; then what it did. */
export function CloseDialog(props: Props) {
  const { open, onOpenChange, batch, counts, openOfBatch, onGo, onClosed } = props;
  const close = useCloseReview(batch.id);
  const refused = undecidedOf(close.error);
  const undecided: readonly UndecidedLine[] =
    refused.length > 0
      ? refused
      : props.lines
          .filter((line) => line.state === 'undecided')
          .map((line) => ({ recordId: line.id, structureNumber: line.structureNumber }));
  const waits = undecided.length > 0 || openOfBatch > 0;
  const done = close.data;

  function change(next: boolean): void {
    if (!next && done) onClosed();
    if (!next) close.reset();
    onOpenChange(next);
  }

  return (
    <Dialog
      open={open}
      onOpenChange={change}
      title={done ? `The review of ${batch.number} is closed` : `Close the review of ${batch.number}`}
      description={
        done
          ? 'The contractor has been written to.'
          : 'Decisions can be undone until then. After it, the contractor is told, and what is approved can go on record.'
      }
    >
      {done ? (
        <div className="grid gap-4">
          <Figures approved={done.approved.length} returned={done.returned.length} held={done.held.length} />
          {done.nextRevision === null ? null : (
            <p>The returned lines are revision {done.nextRevision}, which the contractor now works on.</p>
          )}
          <ButtonLink kind="primary" to={paths.review.to()}>
            To the queue
          </ButtonLink>
        </div>
      ) : (
        <div className="grid gap-4">
          <Figures approved={counts.approved} returned={counts.returned} held={counts.held} />
          {counts.returned > 0 ? (
            <p>
              {counted(counts.returned, 'line')} will make revision {batch.revision.number + 1}, with what is
              due and by when.
            </p>
          ) : null}
          {counts.held > 0 ? <p>Held lines are decided when an engineer answers.</p> : null}
          {waits ? (
            <Callout tone="query" title="Not everything is decided">
              {openOfBatch > 0 ? (
                <p>
                  {counted(openOfBatch, 'finding')} of the batch itself: see the first entry of the lines.
                </p>
              ) : null}
              {undecided.length > 0 ? (
                <>
                  <p>{counted(undecided.length, 'line is', 'lines are')} undecided:</p>
                  <p className="mt-1 flex max-h-40 flex-wrap gap-x-3 gap-y-1 overflow-y-auto">
                    {undecided.map((line) => (
                      <button
                        key={line.recordId}
                        type="button"
                        className="min-h-6 underline decoration-rule underline-offset-4 hover:decoration-ink"
                        onClick={() => {
                          change(false);
                          onGo(line.recordId);
                        }}
                      >
                        {line.structureNumber}
                      </button>
                    ))}
                  </p>
                </>
              ) : null}
            </Callout>
          ) : null}
          {close.error && refused.length === 0 ? (
            <div role="alert">
              <Callout tone="nonconform" title="The review is still open">
                {close.error.message}
              </Callout>
            </div>
          ) : null}
          <div className="flex flex-wrap gap-3">
            <Button
              kind="primary"
              disabled={waits}
              busy={close.isPending && 'Closing…'}
              onClick={() => close.mutate()}
            >
              Close the review
            </Button>
            <Button kind="quiet" onClick={() => change(false)}>
              Not yet
            </Button>
          </div>
        </div>
      )}
    </Dialog>
  );
}

function Figures({ approved, returned, held }: { approved: number; returned: number; held: number }) {
  const rows: readonly { state: keyof typeof LINE_WORDS; count: number }[] = [
    { state: 'approved', count: approved },
    { state: 'returned', count: returned },
    { state: 'held', count: held },
  ];
  return (
    <dl className="grid grid-cols-3 border-y border-hairline py-2">
      {rows.map(({ state, count }) => (
        <div key={state}>
          <dt className="text-table text-ink-2">
            <StateWord {...LINE_WORDS[state]} />
          </dt>
          <dd className="text-title font-semibold">{count}</dd>
        </div>
      ))}
    </dl>
  );
}

import { Button } from '#src/components/ui/button.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { DecisionBar } from '#src/components/ui/progress.tsx';
import { STATUS_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import type { useMoveBatch } from '#src/features/review/api/move-batch.ts';
import { HandOver } from '#src/features/review/components/hand-over.tsx';
import type { DeskCounts } from '#src/features/review/desk/desk-tabs.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly counts: DeskCounts;
  readonly onClose: () => void;
  readonly move: ReturnType<typeof useMoveBatch>;
};

/** The batch, its circumstances, how far its review is, and the one next step. */
export function DeskBand({ batch, counts, onClose, move }: Props) {
  const { revision, workOrder, contractor, can } = batch;
  const user = useUser();
  const holder = revision.inspector;
  // What is shown is what was submitted; a newer revision is the contractor's until they submit it.
  const open = isOpen(batch.status);
  const settled = counts.lines > 0 && counts.undecided === 0;
  return (
    <PageBand
      title={`Batch ${batch.number}`}
      facts={
        <>
          <Fact>
            Work order {workOrder.number} · {workOrder.title}
          </Fact>
          <Fact word="from">{contractor.name}</Fact>
          <Fact word="revision">{open ? revision.number - 1 : revision.number}</Fact>
          {revision.standards.length > 0 ? (
            <Fact word="standard">{revision.standards.join(', ')}</Fact>
          ) : null}
          {holder && holder.id !== user.id ? <Fact word="held by">{holder.name}</Fact> : null}
          {open ? <Fact>revision {revision.number} is with the contractor</Fact> : null}
          {open || batch.status === 'in-review' ? null : (
            <Fact>
              <StateWord {...STATUS_WORDS[batch.status]} />
            </Fact>
          )}
        </>
      }
      actions={
        <>
          <DecisionBar
            total={counts.lines}
            segments={[
              { count: counts.approved, tone: 'conform', word: 'approved' },
              { count: counts.returned, tone: 'nonconform', word: 'returned' },
              { count: counts.held, tone: 'concession', word: 'held for a concession' },
            ]}
          />
          {can.includes('release') ? (
            <Button
              kind="quiet"
              busy={move.isPending && move.variables === 'release' && 'Releasing…'}
              onClick={() => move.mutate('release')}
            >
              Release
            </Button>
          ) : null}
          <HandOver batch={batch} />
          {can.includes('close-review') ? (
            <Button kind={settled ? 'primary' : 'secondary'} onClick={onClose}>
              Close review…
            </Button>
          ) : null}
          {can.includes('take') ? (
            <Button
              kind="primary"
              busy={move.isPending && move.variables === 'take' && 'Taking…'}
              onClick={() => move.mutate('take')}
            >
              Take this batch
            </Button>
          ) : null}
        </>
      }
    />
  );
}

function isOpen(status: Batch['status']): boolean {
  return status === 'draft' || status === 'checking' || status === 'checked';
}

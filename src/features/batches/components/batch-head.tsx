import { useQuery } from '@tanstack/react-query';
import { batchRevisionsQuery } from '#src/lib/api/batch-revisions.ts';
import { SheetsMenu } from './sheets-menu.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { STATUS_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { formatDay } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  /** An earlier revision that is looked at; null: the newest. */
  readonly revision: number | null;
  readonly onRevision: (revision: number | null) => void;
  /** Not for the contractor: whose batch it is. */
  readonly withContractor: boolean;
};

export function BatchHead({ batch, revision, onRevision, withContractor }: Props) {
  const { workOrder, contractor } = batch;
  return (
    <PageBand
      title={`Batch ${batch.number}`}
      facts={
        <>
          <span className="min-w-0 text-ink-2">
            Work order{' '}
            <TextLink to={paths.workOrder.to(workOrder.id)}>
              {workOrder.number} · {workOrder.title}
            </TextLink>
          </span>
          {withContractor ? <Fact word="from">{contractor.name}</Fact> : null}
          <StateWord {...STATUS_WORDS[batch.status]} />
          {batch.revision.inspector ? <Fact word="with">{batch.revision.inspector.name}</Fact> : null}
          {batch.revision.dueOn ? <Fact word="due">{formatDay(batch.revision.dueOn)}</Fact> : null}
        </>
      }
      actions={
        <>
          <RevisionSwitch batch={batch} revision={revision} onRevision={onRevision} />
          {batch.counts.lines > 0 ? (
            <SheetsMenu batchId={batch.id} revision={revision ?? batch.revision.number} />
          ) : null}
        </>
      }
    />
  );
}

type SwitchProps = Omit<Props, 'withContractor'>;

function RevisionSwitch({ batch, revision, onRevision }: SwitchProps) {
  const revisions = useQuery({ ...batchRevisionsQuery(batch.id), enabled: batch.revision.number > 0 });
  if (!revisions.data || revisions.data.length < 2) return null;
  return (
    <label className="flex items-center gap-2 text-table text-muted">
      Revision
      <select
        value={revision ?? batch.revision.number}
        onChange={(event) => {
          const chosen = Number(event.target.value);
          onRevision(chosen === batch.revision.number ? null : chosen);
        }}
        className="min-h-8 border border-rule bg-sheet px-2 text-ink pointer-coarse:min-h-11"
      >
        {revisions.data.map((one) => (
          <option key={one.id} value={one.number}>
            {one.number}, {statusWord(one.status)}
          </option>
        ))}
      </select>
    </label>
  );
}

function statusWord(status: string): string {
  return Object.entries(STATUS_WORDS).find(([key]) => key === status)?.[1].word ?? status;
}

import { useMoveBatch } from '../api/move-batch.ts';
import { isUnanswered, wantsLook, type BatchView } from '../lib/line-view.ts';
import type { Hindrance } from '../lib/why-not-submit.ts';
import { Refusal } from './refusal.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { Dialog } from '#src/components/ui/dialog.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = {
  readonly batch: Batch;
  readonly view: BatchView;
  readonly hindrances: readonly Hindrance[];
  readonly onClose: () => void;
  /** Shows the lines with what must be mended. */
  readonly onShow: (show: 'incomplete' | 'want') => void;
};

/** Says what handing in freezes and what stands, before it is done. */
export function SubmitDialog({ batch, view, hindrances, onClose, onShow }: Props) {
  const move = useMoveBatch(batch);
  const all = [...view.loose, ...view.lines.flatMap((line) => line.findings)];
  const unanswered = all.filter(isUnanswered).length;
  const clean = view.lines.filter((line) => !wantsLook(line)).length;
  const { lines, nonconformity, query, photos, unplacedPhotos } = batch.counts;
  const revision = batch.revision.number > 0 ? `, revision ${batch.revision.number}` : '';
  const blocked = hindrances.length > 0;
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={
        blocked ? `Batch ${batch.number} cannot be submitted yet` : `Submit batch ${batch.number}${revision}`
      }
      description={
        blocked
          ? undefined
          : 'Submitting freezes the files, the lines, the findings and your answers as they are now. You can withdraw it until an inspector takes it.'
      }
    >
      <div className="grid gap-4">
        {hindrances.map(({ code, text }) => (
          <Callout key={code} tone="nonconform">
            <p>{text}</p>
            {code === 'incomplete' ? (
              <Button kind="quiet" size="small" onClick={() => onShow('incomplete')}>
                Show them
              </Button>
            ) : null}
          </Callout>
        ))}
        {blocked ? null : (
          <dl className="grid grid-cols-[1fr_auto] gap-x-6 gap-y-1">
            <Row word="Lines handed in" figure={lines} />
            <Row part word="of them clean" figure={clean} />
            <Row word="Nonconformities that stand" figure={nonconformity} />
            <Row word="Queries that stand" figure={query} />
            <Row word="Findings without an answer in writing" figure={unanswered} />
            <Row word="Photographs" figure={photos} />
            <Row part word="of them on no line" figure={unplacedPhotos} />
          </dl>
        )}
        {!blocked && unanswered > 0 ? (
          <Callout tone="query" title={`${counted(unanswered, 'finding has', 'findings have')} no answer`}>
            <p>It may be submitted so; the inspector then decides on the evidence alone.</p>
            <Button kind="quiet" size="small" onClick={() => onShow('want')}>
              Answer first
            </Button>
          </Callout>
        ) : null}
        {move.isError ? <Refusal error={move.error} batch={batch} onShow={onShow} onClose={onClose} /> : null}
        <div className="flex flex-wrap gap-3">
          {blocked ? null : (
            <Button
              kind="primary"
              busy={move.isPending ? 'Submitting' : false}
              onClick={() => move.mutate('submit', { onSuccess: onClose })}
            >
              Submit {counted(lines, 'line')}
            </Button>
          )}
          <Button onClick={onClose}>{blocked ? 'Close' : 'Not yet'}</Button>
        </div>
      </div>
    </Dialog>
  );
}

function Row({ word, figure, part }: { word: string; figure: number; part?: boolean }) {
  return (
    <>
      <dt className={classNames('text-ink-2', part && 'pl-4 text-muted')}>{word}</dt>
      <dd className="text-right font-semibold">{figure.toLocaleString('en-US')}</dd>
    </>
  );
}

import { IntakeRow } from './intake-row.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { HandOver } from '#src/features/review/components/hand-over.tsx';
import { counted } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Where a batch is that was handed in, and what happens next. */
export function ReviewRow({ batch }: { batch: Batch }) {
  const { revision, counts, status } = batch;
  if (revision.submittedAt === null) return null;
  const by = revision.inspector?.name ?? 'An inspector';
  return (
    <IntakeRow glyph={status === 'decided' || status === 'on-record' ? 'tick' : 'dotted'} title="Review">
      <p>
        Submitted <Moment at={revision.submittedAt} />
      </p>
      {status === 'submitted' ? (
        <p>
          No inspector has taken it yet
          {batch.can.includes('withdraw') ? '; until then you can withdraw it.' : '.'}
        </p>
      ) : null}
      {status === 'in-review' ? (
        <p>{by} looks at it. What is decided is told when the review is closed.</p>
      ) : null}
      {revision.decidedAt ? (
        <p>
          Review closed by {by} <Moment at={revision.decidedAt} />
        </p>
      ) : null}
      {status === 'decided' ? (
        <p>
          {counts.decided === counts.lines
            ? 'Every line is decided; the approved ones go on record.'
            : `${counts.decided} of ${counted(counts.lines, 'line')} decided.`}
        </p>
      ) : null}
      {status === 'on-record' ? <p>Every approved line is on record.</p> : null}
      {batch.can.includes('take') || batch.can.includes('close-review') ? (
        <TextLink to={paths.reviewBatch.to(batch.id)} className="inline-block pointer-coarse:py-2">
          Open it on the review desk
        </TextLink>
      ) : null}
      {batch.can.includes('assign') ? (
        <div className="mt-2">
          <HandOver batch={batch} />
        </div>
      ) : null}
    </IntakeRow>
  );
}

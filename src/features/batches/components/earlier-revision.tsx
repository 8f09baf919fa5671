import { useQuery } from '@tanstack/react-query';
import { batchRevisionsQuery } from '#src/lib/api/batch-revisions.ts';
import { IntakeRow } from './intake-row.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { counted } from '#src/lib/formats.ts';

type Props = { readonly batchId: string; readonly revision: number; readonly onNewest: () => void };

/** Beside an earlier revision: what it was, and the way back to the one that is worked on. */
export function EarlierRevision({ batchId, revision, onNewest }: Props) {
  const revisions = useQuery(batchRevisionsQuery(batchId));
  const one = revisions.data?.find(({ number }) => number === revision);
  return (
    <>
      <IntakeRow glyph="info" title={`Revision ${revision}, as it was`}>
        {one?.submittedAt ? (
          <p>
            Submitted <Moment at={one.submittedAt} />
          </p>
        ) : null}
        {one?.decidedAt ? (
          <p>
            Decided <Moment at={one.decidedAt} />
          </p>
        ) : null}
        {one ? <p>{counted(one.lines, 'line')}; nothing of it can be changed.</p> : null}
      </IntakeRow>
      <div className="border-b border-hairline px-gutter py-3">
        <Button onClick={onNewest}>Back to the newest revision</Button>
      </div>
    </>
  );
}

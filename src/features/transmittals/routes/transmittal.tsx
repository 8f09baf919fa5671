import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Button } from '#src/components/ui/button.tsx';
import { Callout } from '#src/components/ui/callout.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { ExportLink } from '#src/components/ui/export-link.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Progress } from '#src/components/ui/progress.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { useProgress } from '#src/lib/api/use-progress.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Transmittal } from '#shared/generated/api-types.ts';
import { transmittalQuery } from '../api/transmittal.ts';
import { IssueAgainDialog } from '../components/issue-again-dialog.tsx';
import { TransmittalFacts } from '../components/transmittal-facts.tsx';
import { TransmittalState } from '../components/transmittal-state.tsx';

export function Component() {
  const { id = '' } = useParams();
  const navigate = useNavigate();
  const found = useQuery(transmittalQuery(id));
  const [asking, setAsking] = useState(false);
  const one = found.data;
  return (
    <>
      <DocumentTitle>{one ? `${one.number} revision ${one.revision}` : 'Transmittal'}</DocumentTitle>
      <PageBand
        title={one ? one.number : 'Transmittal'}
        facts={
          one ? (
            <>
              <Fact word="revision">
                <b>{one.revision}</b>
              </Fact>
              <TransmittalState state={one.state} />
            </>
          ) : null
        }
        actions={
          one ? (
            <>
              {one.can.includes('issue-again') ? (
                <Button size="small" onClick={() => setAsking(true)}>
                  Issue again…
                </Button>
              ) : null}
              {one.state === 'issued' ? (
                <ExportLink kind="primary" path={`/api/transmittals/${one.id}/file`}>
                  Download the workbook
                </ExportLink>
              ) : null}
            </>
          ) : null
        }
      />
      {found.isPending ? <Skeleton lines={6} /> : null}
      {found.isError ? (
        <ErrorState error={found.error} what="The transmittal" onRetry={() => void found.refetch()} />
      ) : null}
      {one ? (
        <>
          <Writing key={one.id} one={one} />
          <TransmittalFacts one={one} />
          <p className="px-gutter py-3">
            <TextLink to={paths.transmittals.to()}>All transmittals</TextLink>
          </p>
          <IssueAgainDialog
            key={`again ${one.id}`}
            one={one}
            open={asking}
            onOpenChange={setAsking}
            onIssued={(made) => {
              setAsking(false);
              void navigate(paths.transmittal.to(made.id));
            }}
          />
        </>
      ) : null}
    </>
  );
}

/** Rows written of rows while it is at work; why and what to do when it failed. */
function Writing({ one }: { one: Transmittal }) {
  const client = useQueryClient();
  const administers = useCan('read', 'Job');
  const atWork = one.state === 'queued' || one.state === 'running';
  const progress = useProgress(atWork ? `transmittal:${one.id}` : null, {
    poll: async () => {
      const { state, done, rows, problem } = await client.fetchQuery({
        ...transmittalQuery(one.id),
        staleTime: 0,
      });
      return { state, done, total: rows, problem };
    },
    onFinal: () => void client.invalidateQueries({ queryKey: ['transmittals'] }),
  });
  if (atWork) {
    const waiting = (progress?.state ?? one.state) === 'queued';
    return (
      <div className="max-w-xl px-gutter py-4">
        <Progress
          done={progress?.done ?? one.done}
          total={progress?.total ?? one.rows}
          things={waiting ? 'records written; waits for its turn' : 'records written'}
          label="Writing the workbook"
        />
        <p className="mt-2 text-table text-muted">
          You can leave this page; the workbook is written all the same.
        </p>
      </div>
    );
  }
  if (one.state !== 'failed') return null;
  return (
    <div className="max-w-3xl px-gutter py-4">
      <Callout tone="nonconform" title="The workbook could not be written">
        <p>{one.problem ?? 'No reason was kept. Nothing was issued.'}</p>
        {administers ? (
          <p className="mt-1">
            <TextLink to={paths.jobs.to()}>See the parked jobs</TextLink>
          </p>
        ) : (
          <p className="mt-1">Ask an administrator to try it again, or issue the same scope anew.</p>
        )}
      </Callout>
    </div>
  );
}

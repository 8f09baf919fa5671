import { useQuery } from '@tanstack/react-query';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { formatCount } from '#src/lib/formats.ts';
import { parkedJobsQuery } from '../api/parked-jobs.ts';
import { ParkedJobItem } from '../components/parked-job-item.tsx';

/** Work of the server that failed as often as it may and waits for somebody. */
export function Component() {
  const jobs = useQuery(parkedJobsQuery);
  const parked = jobs.data ?? [];
  return (
    <>
      <DocumentTitle>Jobs</DocumentTitle>
      <PageBand
        title="Parked jobs"
        facts={
          jobs.data ? (
            <Fact>
              <b>{formatCount(parked.length)}</b> wait for you
            </Fact>
          ) : null
        }
      />
      {jobs.isPending ? <Skeleton lines={5} /> : null}
      {jobs.isError ? (
        <ErrorState error={jobs.error} what="The list" onRetry={() => void jobs.refetch()} />
      ) : null}
      {jobs.isSuccess && parked.length === 0 ? (
        <EmptyState title="Nothing stands still">
          A job that fails is tried again by itself. One that fails every time is parked here, with its
          reason, until you try it again.
        </EmptyState>
      ) : null}
      <ul>
        {parked.map((job) => (
          <ParkedJobItem key={job.id} job={job} />
        ))}
      </ul>
      <StatusBar left="Looked up every 15 seconds" />
    </>
  );
}

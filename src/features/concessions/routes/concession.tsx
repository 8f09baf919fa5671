import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { concessionQuery } from '#src/features/concessions/api/concession.ts';
import { ConcessionPage } from '#src/features/concessions/components/concession-page.tsx';

export function Component() {
  const { id = '' } = useParams();
  const concession = useQuery(concessionQuery(id));
  return (
    <>
      <DocumentTitle>{concession.data ? `Concession ${concession.data.number}` : 'Concession'}</DocumentTitle>
      {concession.data ? <ConcessionPage concession={concession.data} /> : null}
      {concession.isPending ? <Skeleton lines={8} label="Loading the concession" /> : null}
      {concession.isError && !concession.data ? (
        <ErrorState
          error={concession.error}
          what="The concession"
          onRetry={() => void concession.refetch()}
        />
      ) : null}
    </>
  );
}

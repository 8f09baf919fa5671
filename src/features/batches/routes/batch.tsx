import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { batchQuery } from '../api/batch.ts';
import { BatchPage } from '../components/batch-page.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';

export function Component() {
  const { id = '' } = useParams();
  const batch = useQuery(batchQuery(id));
  if (batch.data) return <BatchPage key={batch.data.id} batch={batch.data} />;
  if (batch.isError) {
    return <ErrorState error={batch.error} what="The batch" onRetry={() => void batch.refetch()} />;
  }
  return <Skeleton lines={10} />;
}

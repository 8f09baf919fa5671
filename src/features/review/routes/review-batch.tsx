import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { reviewBatchQuery } from '#src/features/review/api/review-batch.ts';
import { reviewLinesQuery } from '#src/features/review/api/review-lines.ts';
import { Desk } from '#src/features/review/components/desk.tsx';

export function Component() {
  const { id = '' } = useParams();
  const client = useQueryClient();
  const batch = useQuery(reviewBatchQuery(id));
  const lines = useQuery(reviewLinesQuery(id));
  const error = batch.error ?? lines.error;
  const title = batch.data ? `Review of ${batch.data.number}` : 'Review';
  if (error && !(batch.data && lines.data)) {
    return (
      <>
        <DocumentTitle>{title}</DocumentTitle>
        <ErrorState
          error={error}
          what="The batch"
          onRetry={() => void client.invalidateQueries({ queryKey: ['review', id] })}
        />
      </>
    );
  }
  if (!batch.data || !lines.data) return <Skeleton lines={14} />;
  if (lines.data.length === 0) {
    return (
      <>
        <DocumentTitle>{title}</DocumentTitle>
        <EmptyState title={`Batch ${batch.data.number} has nothing to review`}>
          Its newest revision is still with the contractor. It comes to the{' '}
          <TextLink to={paths.review.to()}>queue</TextLink> when it is submitted.
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <DocumentTitle>{title}</DocumentTitle>
      <Desk
        key={batch.data.revision.id}
        batch={batch.data}
        lines={lines.data}
        onClosed={() => void client.invalidateQueries({ queryKey: ['review', id] })}
      />
    </>
  );
}

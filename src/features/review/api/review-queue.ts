import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Batches that wait for an inspector or are with one. */
export function useReviewQueue(status: 'submitted' | 'in-review' | undefined) {
  return useKeysetList<Batch>({
    key: 'review-queue',
    path: '/api/batches',
    query: { status: status ?? ['submitted', 'in-review'] },
  });
}

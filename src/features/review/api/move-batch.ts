import { useMutation, useQueryClient } from '@tanstack/react-query';
import { reviewBatchQuery } from '#src/features/review/api/review-batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Takes a batch from the queue, or gives it back. The lines are asked for again: what may be done with them changes. */
export function useMoveBatch(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (word: 'take' | 'release') =>
      api<Batch>(`/api/batches/${batchId}/${word}`, { method: 'POST' }),
    onSuccess: (batch) => client.setQueryData(reviewBatchQuery(batchId).queryKey, batch),
    // Refused or not, somebody moved it: the newer state is fetched.
    onSettled: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['review', batchId] }),
        client.invalidateQueries({ queryKey: ['records'] }),
        client.invalidateQueries({ queryKey: ['review-queue'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
      ]);
    },
  });
}

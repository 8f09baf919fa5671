import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

export const reviewBatchQuery = (batchId: string) =>
  queryOptions({
    queryKey: ['review', batchId],
    queryFn: ({ signal }) => api<Batch>(`/api/batches/${batchId}`, { signal }),
    // An administrator may hand the review to another meanwhile: whoever held it is told, and sees what is left to do.
    refetchInterval: 20_000,
  });

import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** All that is known of one batch lies under this key. */
export const batchKey = (batchId: string) => ['batches', batchId] as const;

export const batchQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'batch'],
    queryFn: ({ signal }) => api<Batch>(`/api/batches/${batchId}`, { signal }),
  });

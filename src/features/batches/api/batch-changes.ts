import { queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { BatchChanges } from '#shared/generated/api-types.ts';

/** What changed between the last two checks. */
export const batchChangesQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'changes'],
    queryFn: ({ signal }) => api<BatchChanges>(`/api/batches/${batchId}/changes`, { signal }),
  });

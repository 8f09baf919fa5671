import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { BatchChanges } from '#shared/generated/api-types.ts';

/** What changed since the workbook before, or the revision that was decided: a value that came to pass is looked at twice. */
export const batchChangesQuery = (batchId: string) =>
  queryOptions({
    queryKey: ['review', batchId, 'changes'],
    queryFn: ({ signal }) => api<BatchChanges>(`/api/batches/${batchId}/changes`, { signal }),
  });

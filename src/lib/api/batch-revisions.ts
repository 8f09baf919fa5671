import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { BatchRevision } from '#shared/generated/api-types.ts';

/** Revisions of a batch, newest first. */
export const batchRevisionsQuery = (batchId: string) =>
  queryOptions({
    queryKey: ['batches', batchId, 'revisions'],
    queryFn: async ({ signal }) =>
      (await api<{ items: BatchRevision[] }>(`/api/batches/${batchId}/revisions`, { signal })).items,
  });

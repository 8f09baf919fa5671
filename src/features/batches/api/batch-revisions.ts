import { queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { BatchRevision } from '#shared/generated/api-types.ts';

export const batchRevisionsQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'revisions'],
    queryFn: async ({ signal }) =>
      (await api<{ items: BatchRevision[] }>(`/api/batches/${batchId}/revisions`, { signal })).items,
  });

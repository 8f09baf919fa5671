import { queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { InputRow } from '#shared/generated/api-types.ts';

/** Every file ever handed in with the batch. */
export const batchInputsQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'inputs'],
    queryFn: async ({ signal }) =>
      (await api<{ items: InputRow[] }>(`/api/batches/${batchId}/inputs`, { signal })).items,
  });

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** `recheck`: the same files on what is in force now. */
export type BatchMove = 'submit' | 'withdraw' | 'recheck';

/** @throws ApiProblem 409 with the reason why not */
export function useMoveBatch(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (move: BatchMove) => api<Batch>(`/api/batches/${batchId}/${move}`, { method: 'POST' }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: batchKey(batchId) }),
        client.invalidateQueries({ queryKey: ['batches', 'list'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
        client.invalidateQueries({ queryKey: ['work-orders'] }),
      ]),
  });
}

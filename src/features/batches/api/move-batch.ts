import { useMutation, useQueryClient } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** `recheck`: the same files on what is in force now. */
export type BatchMove = 'submit' | 'withdraw' | 'recheck';

/**
 * `batch` as it is shown: it is not submitted when something came in that was not seen.
 * @throws ApiProblem 409 with the reason why not
 */
export function useMoveBatch({ id: batchId, input }: Pick<Batch, 'id' | 'input'>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (move: BatchMove) =>
      api<Batch>(`/api/batches/${batchId}/${move}`, {
        method: 'POST',
        query: move === 'submit' && input > 0 ? { input } : undefined,
      }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: batchKey(batchId) }),
        client.invalidateQueries({ queryKey: ['batches', 'list'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
        client.invalidateQueries({ queryKey: ['work-orders'] }),
      ]),
  });
}

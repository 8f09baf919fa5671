import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Begins a batch of a work order. */
export function useStartBatch() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (workOrderId: string) =>
      api<Batch>(`/api/work-orders/${workOrderId}/batches`, {
        method: 'POST',
        idempotencyKey: newIdempotencyKey(),
      }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['batches', 'list'] }),
        client.invalidateQueries({ queryKey: ['work-orders'] }),
      ]),
  });
}

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { CreateWorkOrderBody, WorkOrder } from '#shared/generated/api-types.ts';

/** @throws ApiProblem 409 the number is taken, 422 a field */
export function useCreateWorkOrder() {
  const client = useQueryClient();
  const [intent, setIntent] = useState(newIdempotencyKey);
  return useMutation({
    mutationFn: (body: CreateWorkOrderBody) =>
      api<WorkOrder>('/api/work-orders', { method: 'POST', body, idempotencyKey: intent }),
    // A refusal is kept under its key: what is sent after a correction is another intent.
    onSettled: () => {
      setIntent(newIdempotencyKey());
      return client.invalidateQueries({ queryKey: ['work-orders'] });
    },
  });
}

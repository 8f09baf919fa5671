import { useMutation, useQueryClient } from '@tanstack/react-query';
import { reviewScope } from '#src/features/review/desk/use-decide.ts';
import { api } from '#src/lib/api/client.ts';
import type { ApproveCleanReply } from '#shared/generated/api-types.ts';

/** Approves every undecided line without findings. */
export function useApproveClean(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    scope: reviewScope(batchId),
    mutationFn: () => api<ApproveCleanReply>(`/api/batches/${batchId}/approve-clean`, { method: 'POST' }),
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: ['review', batchId] });
      await client.invalidateQueries({ queryKey: ['records'] });
    },
  });
}

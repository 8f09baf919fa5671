import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { api } from '#src/lib/api/client.ts';
import type { CloseReviewReply } from '#shared/generated/api-types.ts';

/** Closes the review. Refused with 409 while something is undecided. */
export function useCloseReview(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api<CloseReviewReply>(`/api/batches/${batchId}/close-review`, { method: 'POST' }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['records'] }),
        // The desk behind the result stays as it is until the result has been read.
        client.invalidateQueries({ queryKey: ['review', batchId], refetchType: 'none' }),
        client.invalidateQueries({ queryKey: ['review-queue'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
        client.invalidateQueries({ queryKey: ['concessions'] }),
      ]);
    },
  });
}

export type UndecidedLine = { readonly recordId: string; readonly structureNumber: string };

/** The lines that a refusal to close names. */
export function undecidedOf(error: unknown): readonly UndecidedLine[] {
  if (!(error instanceof ApiProblem) || !('undecided' in error.body)) return [];
  const { undecided } = error.body;
  return Array.isArray(undecided) ? (undecided as UndecidedLine[]) : [];
}

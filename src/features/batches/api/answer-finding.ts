import { useMutation, useQueryClient } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

export function useAnswerFinding(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ findingId, text }: { findingId: string; text: string }) =>
      api<FindingRow>(`/api/findings/${findingId}/answer`, { method: 'PUT', body: { text } }),
    onSuccess: () => client.invalidateQueries({ queryKey: [...batchKey(batchId), 'findings'] }),
  });
}

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

export const LINE_MOVES = ['reopen', 'refer-back', 'abandon'] as const;
export type LineMove = (typeof LINE_MOVES)[number];

/** After a review has closed: an inspector reopens, a clerk refers back, an administrator abandons; each says why. */
export function useMoveLine(recordId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ move, reason }: { move: LineMove; reason: string }) =>
      api<RecordRow>(`/api/records/${recordId}/${move}`, { method: 'POST', body: { reason } }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: recordSheetQuery(recordId).queryKey }),
        client.invalidateQueries({ queryKey: ['review'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
      ]);
    },
  });
}

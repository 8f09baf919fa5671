import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { SheetFile, SheetFileBody } from '#shared/generated/api-types.ts';

export const sheetFileQuery = (id: string) =>
  queryOptions({
    queryKey: ['sheet-files', id],
    queryFn: ({ signal }) => api<SheetFile>(`/api/sheets/${encodeURIComponent(id)}`, { signal }),
  });

/** Asks for the record sheets of a batch as one PDF. */
export function useMakeSheets(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SheetFileBody) =>
      api<SheetFile>(`/api/batches/${encodeURIComponent(batchId)}/sheets`, {
        method: 'POST',
        body,
        idempotencyKey: newIdempotencyKey(),
      }),
    onSuccess: (made) => client.setQueryData(['sheet-files', made.id], made),
  });
}

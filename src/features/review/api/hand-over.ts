import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Page } from '#src/lib/api/use-keyset-list.ts';
import type { Batch, Person } from '#shared/generated/api-types.ts';

/** Inspectors with an open account, by name. */
export const inspectorsQuery = queryOptions({
  queryKey: ['people', 'inspectors'],
  queryFn: ({ signal }) =>
    api<Page<Person>>('/api/people', { query: { role: 'inspector', active: true, limit: 100 }, signal }),
  select: (page) => page.items,
});

/** Gives a waiting batch, or one under review, to an inspector. Refused or not, the newer state is fetched. */
export function useHandOver(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { inspectorId: string; reason?: string }) =>
      api<Batch>(`/api/batches/${batchId}/assign`, { method: 'POST', body }),
    onSettled: async () => {
      await Promise.all(
        [['batches'], ['review', batchId], ['records'], ['review-queue'], ['home']].map((queryKey) =>
          client.invalidateQueries({ queryKey }),
        ),
      );
    },
  });
}

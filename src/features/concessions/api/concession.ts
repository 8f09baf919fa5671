import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Concession, ConcessionDecisionBody } from '#shared/generated/api-types.ts';

export const concessionQuery = (id: string) =>
  queryOptions({
    queryKey: ['concessions', id],
    queryFn: ({ signal }) => api<Concession>(`/api/concessions/${id}`, { signal }),
  });

/** Grants or refuses. Throws 412 with the newer state when another engineer was faster; it is put in place. */
export function useDecideConcession(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, body }: { version: number; body: ConcessionDecisionBody }) =>
      api<Concession>(`/api/concessions/${id}/decision`, { method: 'PUT', body, ifMatch: version }),
    onSuccess: (concession) => client.setQueryData(concessionQuery(id).queryKey, concession),
    onSettled: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['concessions'] }),
        client.invalidateQueries({ queryKey: ['records'] }),
        client.invalidateQueries({ queryKey: ['review'] }),
        client.invalidateQueries({ queryKey: ['home'] }),
      ]);
    },
  });
}

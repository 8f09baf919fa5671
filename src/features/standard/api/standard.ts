import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { StandardDraftBody, StandardVersion } from '#shared/generated/api-types.ts';

export const standardVersionsQuery = queryOptions({
  queryKey: ['standard', 'versions'],
  queryFn: async ({ signal }) =>
    (await api<{ items: StandardVersion[] }>('/api/standard/versions', { signal })).items,
});

/** Drafts the next version; the same draft sent twice is one version. */
export function useDraftStandard(): (body: StandardDraftBody) => Promise<StandardVersion> {
  const client = useQueryClient();
  const intent = useRef({ text: '', key: '' });
  return useCallback(
    async (body) => {
      const text = JSON.stringify(body);
      if (intent.current.text !== text) intent.current = { text, key: newIdempotencyKey() };
      const made = await api<StandardVersion>('/api/standard/versions', {
        method: 'POST',
        body,
        idempotencyKey: intent.current.key,
      });
      await client.invalidateQueries({ queryKey: ['standard'] });
      return made;
    },
    [client],
  );
}

/** Whatever comes of it, the versions are read again: a refusal tells that they have changed. */
export function usePublishStandard() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ n, version }: StandardVersion) =>
      api<StandardVersion>(`/api/standard/versions/${n}/publish`, { method: 'POST', ifMatch: version }),
    onSettled: () => client.invalidateQueries({ queryKey: ['standard'] }),
  });
}

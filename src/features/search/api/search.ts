import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { SearchReply } from '#shared/generated/api-types.ts';

export type SearchHit = SearchReply['items'][number];

/** What a search found; nothing is asked for an empty one. */
export const searchQuery = (q: string) =>
  queryOptions({
    queryKey: ['search', q],
    enabled: q !== '',
    queryFn: async ({ signal }) => (await api<SearchReply>('/api/search', { query: { q }, signal })).items,
  });

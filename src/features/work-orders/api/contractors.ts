import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Organisation } from '#shared/generated/api-types.ts';

/** Whom a work order can be let to. */
export const contractorsQuery = queryOptions({
  queryKey: ['organisations', 'contractors'],
  queryFn: async ({ signal }) => {
    const { items } = await api<{ items: Organisation[] }>('/api/organisations', { signal });
    return items.filter((one) => one.kind === 'contractor');
  },
});

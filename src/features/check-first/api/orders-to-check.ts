import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

const MOST = 100;

/** Work orders, newest first. */
export const ordersToCheckQuery = queryOptions({
  queryKey: ['work-orders', 'to-check'],
  queryFn: async ({ signal }) => {
    const page = await api<{ readonly items: readonly WorkOrder[] }>('/api/work-orders', {
      query: { limit: MOST },
      signal,
    });
    return page.items;
  },
});

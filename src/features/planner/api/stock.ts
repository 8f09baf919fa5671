import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { PlannerLot } from '#shared/generated/api-types.ts';

/** Kits left by lot and size, for those who may see lots. */
export const stockQuery = (product: string) =>
  queryOptions({
    queryKey: ['lots', 'stock', product],
    queryFn: async ({ signal }) =>
      (await api<{ items: PlannerLot[] }>('/api/planner/stock', { query: { product }, signal })).items,
    enabled: product !== '',
  });

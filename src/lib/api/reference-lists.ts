import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { Organisation, Product, WorkOrder } from '#shared/generated/api-types.ts';

/** Short lists that filters and forms choose from; they change seldom. */
const staleTime = 5 * 60_000;

export const organisationsQuery = queryOptions({
  queryKey: ['organisations', 'all'],
  queryFn: ({ signal }) => everyPage<Organisation>('/api/organisations', { signal }),
  staleTime,
});

export const workOrderChoicesQuery = queryOptions({
  queryKey: ['work-orders', 'all'],
  queryFn: ({ signal }) => everyPage<WorkOrder>('/api/work-orders', { signal }),
  staleTime,
});

export const productsQuery = queryOptions({
  queryKey: ['products', 'all'],
  queryFn: async ({ signal }) => (await api<{ items: Product[] }>('/api/products', { signal })).items,
  staleTime,
});

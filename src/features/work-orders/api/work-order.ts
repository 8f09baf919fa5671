import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

export const workOrderQuery = (id: string) =>
  queryOptions({
    queryKey: ['work-orders', id],
    queryFn: ({ signal }) => api<WorkOrder>(`/api/work-orders/${id}`, { signal }),
  });

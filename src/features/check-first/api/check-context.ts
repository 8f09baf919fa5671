import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';

/** Standard, products, lots and design list that a workbook of the order is checked against. */
export const checkContextQuery = (workOrderId: string) =>
  queryOptions({
    queryKey: ['work-orders', workOrderId, 'check-context'],
    queryFn: ({ signal }) =>
      api<CheckContextData>(`/api/work-orders/${workOrderId}/check-context`, { signal }),
  });

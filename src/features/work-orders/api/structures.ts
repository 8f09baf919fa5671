import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';

/** The whole design list: it is sorted and filtered on the page, where it is at most some thousands. */
export const structuresQuery = (workOrderId: string) =>
  queryOptions({
    queryKey: ['work-orders', workOrderId, 'structures'],
    queryFn: async ({ signal }) =>
      (await api<{ items: PlannedStructure[] }>(`/api/work-orders/${workOrderId}/structures`, { signal }))
        .items,
  });

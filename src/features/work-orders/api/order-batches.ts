import { queryOptions } from '@tanstack/react-query';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { Batch } from '#shared/generated/api-types.ts';

export const orderBatchesQuery = (workOrderId: string) =>
  queryOptions({
    queryKey: ['batches', 'list', 'of-order', workOrderId],
    queryFn: ({ signal }) => everyPage<Batch>('/api/batches', { query: { workOrder: workOrderId }, signal }),
  });

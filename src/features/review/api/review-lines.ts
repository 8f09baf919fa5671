import { queryOptions } from '@tanstack/react-query';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

/** All lines of the revision under review, in the workbook's order. */
export const reviewLinesQuery = (batchId: string) =>
  queryOptions({
    queryKey: ['review', batchId, 'lines'],
    queryFn: ({ signal }) => everyPage<RecordRow>(`/api/batches/${batchId}/records`, { signal }),
  });

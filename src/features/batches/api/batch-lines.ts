import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';

/** Lines of one revision in the workbook's order. */
export const batchLinesQuery = (batchId: string, revision: number) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'lines', revision],
    queryFn: ({ signal }) =>
      everyPage<RecordRow>(`/api/batches/${batchId}/records`, { query: { revision }, signal }),
    placeholderData: keepPreviousData,
  });

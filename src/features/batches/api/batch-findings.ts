import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

export const batchFindingsQuery = (batchId: string, revision: number) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'findings', revision],
    queryFn: ({ signal }) =>
      everyPage<FindingRow>(`/api/batches/${batchId}/findings`, { query: { revision }, signal }),
    placeholderData: keepPreviousData,
  });

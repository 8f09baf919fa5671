import { queryOptions } from '@tanstack/react-query';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

/** Findings that belong to no line: of the workbook as a whole. */
export const batchFindingsQuery = (batchId: string) =>
  queryOptions({
    queryKey: ['review', batchId, 'findings'],
    queryFn: ({ signal }) =>
      everyPage<FindingRow>(`/api/batches/${batchId}/findings`, { query: { withoutLine: true }, signal }),
  });

import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';

/** Everything the record sheet shows of one line. */
export const recordSheetQuery = (recordId: string) =>
  queryOptions({
    queryKey: ['records', recordId],
    queryFn: ({ signal }) => api<RecordSheetData>(`/api/records/${recordId}`, { signal }),
  });

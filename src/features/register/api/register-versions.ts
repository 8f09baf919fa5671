import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';

/** Every version of one record number. */
export const registerVersionsQuery = (recordNumber: string) =>
  queryOptions({
    queryKey: ['register', 'versions', recordNumber],
    queryFn: async ({ signal }) =>
      (
        await api<{ items: RegisterRow[] }>(`/api/register/${encodeURIComponent(recordNumber)}`, { signal })
      ).items.toSorted((a, b) => b.version - a.version),
  });

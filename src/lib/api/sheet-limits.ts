import { queryOptions } from '@tanstack/react-query';
import { sheetLimits } from '#shared/drawing/sheet-limits.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import type { Standard } from '#shared/generated/records.ts';
import { api } from '#src/lib/api/client.ts';

/** A published version never changes, so its limits are asked for once. `n` 0: the line has no standard. */
export const sheetLimitsQuery = (n: number) =>
  queryOptions({
    queryKey: ['standard', n, 'limits'],
    queryFn: async ({ signal }) => {
      const version = await api<StandardVersion>(`/api/standard/versions/${n}`, { signal });
      return sheetLimits(version.body as unknown as Standard);
    },
    enabled: n > 0,
    staleTime: Number.POSITIVE_INFINITY,
  });

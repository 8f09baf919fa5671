import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Transmittal } from '#shared/generated/api-types.ts';

export const transmittalQuery = (id: string) =>
  queryOptions({
    queryKey: ['transmittals', 'one', id],
    queryFn: ({ signal }) => api<Transmittal>(`/api/transmittals/${id}`, { signal }),
  });

import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { CapturedMessage } from '#shared/generated/api-types.ts';

export const messageQuery = (id: string) =>
  queryOptions({
    queryKey: ['mail', 'one', id],
    queryFn: ({ signal }) => api<CapturedMessage>(`/api/mail/${id}`, { signal }),
  });

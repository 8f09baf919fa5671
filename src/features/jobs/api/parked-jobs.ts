import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { ParkedJob } from '#shared/generated/api-types.ts';

export const parkedJobsQuery = queryOptions({
  queryKey: ['jobs', 'parked'],
  queryFn: async ({ signal }) => (await api<{ items: ParkedJob[] }>('/api/jobs/parked', { signal })).items,
  refetchInterval: 15_000,
});

export function useRetryJob() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (job: ParkedJob) => api<void>(`/api/jobs/parked/${job.id}/retry`, { method: 'POST' }),
    onSettled: () => client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}

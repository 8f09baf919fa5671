import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { FilterValues } from '#src/lib/filters/filter-params.ts';
import type { NonconformitySummary } from '#shared/generated/api-types.ts';

/** Totals over the filter; those before stay while others load. */
export const nonconformitySummaryQuery = (filters: FilterValues) =>
  queryOptions({
    queryKey: ['nonconformities', 'summary', filters],
    queryFn: ({ signal }) =>
      api<NonconformitySummary>('/api/nonconformities/summary', { query: filters, signal }),
    placeholderData: keepPreviousData,
  });

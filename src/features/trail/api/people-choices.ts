import { queryOptions } from '@tanstack/react-query';
import { everyPage } from '#src/lib/api/every-page.ts';
import type { Person } from '#shared/generated/api-types.ts';

/** Everybody who ever could sign in, for choosing whose steps to show. */
export const peopleChoicesQuery = queryOptions({
  queryKey: ['people', 'all'],
  queryFn: ({ signal }) => everyPage<Person>('/api/people', { signal }),
  staleTime: 5 * 60_000,
});

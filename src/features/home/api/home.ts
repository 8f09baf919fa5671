import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';

export type Waiting = {
  readonly key: string;
  readonly title: string;
  readonly count: number;
  readonly to: string;
  readonly detail?: string | null;
};
export type Recent = {
  readonly title: string;
  readonly detail?: string | null;
  readonly to: string | null;
  /** An instant, ISO 8601. */
  readonly at: string;
};
export type Home = { readonly items: readonly Waiting[]; readonly recent: readonly Recent[] };

export const homeQuery = queryOptions({
  queryKey: ['home'],
  queryFn: ({ signal }) => api<Home>('/api/home', { signal }),
  staleTime: 0,
});

import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Role } from '#shared/permissions/ability.ts';

export type DemoAccount = {
  readonly email: string;
  readonly role: Role;
  readonly name: string;
  readonly organisation: string;
};
export type AppInfo = {
  readonly owner: string;
  /** Only where the demo is seeded. */
  readonly demo: { readonly password: string; readonly accounts: readonly DemoAccount[] } | null;
};

export const appInfoQuery = queryOptions({
  queryKey: ['app'],
  queryFn: ({ signal }) => api<AppInfo>('/api/app', { signal, withoutSession: true }),
  staleTime: Infinity,
});

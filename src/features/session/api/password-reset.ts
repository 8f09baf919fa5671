import { queryOptions } from '@tanstack/react-query';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';

/** Answers the same whether or not the address is known. */
export function requestReset(input: { email: string }): Promise<void> {
  return api<void>('/api/password-resets', {
    method: 'POST',
    body: input,
    idempotencyKey: newIdempotencyKey(),
    withoutSession: true,
  });
}

export function setPassword(input: { token: string; password: string }): Promise<void> {
  return api<void>(`/api/password-resets/${encodeURIComponent(input.token)}`, {
    method: 'PUT',
    body: { password: input.password },
    withoutSession: true,
  });
}

export type ResetLink = { readonly email: string; readonly purpose: 'invitation' | 'password-reset' };

/** Whom the link belongs to; refused when it was used or is too old. */
export const resetLinkQuery = (token: string) =>
  queryOptions({
    queryKey: ['password-reset', token],
    queryFn: ({ signal }) =>
      api<ResetLink>(`/api/password-resets/${encodeURIComponent(token)}`, { withoutSession: true, signal }),
    retry: false,
    staleTime: Infinity,
  });

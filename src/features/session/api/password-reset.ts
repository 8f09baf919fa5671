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

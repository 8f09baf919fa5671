import { queryOptions, useQuery } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import { ApiProblem } from '#src/lib/api/api-problem.ts';
import { csrfToken, setCsrfToken } from '#src/lib/api/csrf-token.ts';
import type { Actor, Role } from '#shared/permissions/ability.ts';

export type SessionUser = {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly organisation: { readonly id: string; readonly name: string };
};

export type Session = {
  readonly user: SessionUser;
  readonly abilities: readonly unknown[];
  readonly csrfToken: string;
};

/**
 * Null: nobody is signed in, which is an answer and not a fault. Where somebody was, the session has ended
 * and the page waits for them to sign in again instead of throwing away what stands on it.
 */
async function fetchSession(signal: AbortSignal): Promise<Session | null> {
  const fresh = csrfToken() === null;
  // Asked first, so that a visitor's page does not begin with a refused request.
  if (fresh && !(await api<{ signedIn: boolean }>('/api/app', { withoutSession: true, signal })).signedIn)
    return null;
  try {
    const session = await api<Session>('/api/session', { withoutSession: fresh, signal });
    setCsrfToken(session.csrfToken);
    return session;
  } catch (error) {
    if (error instanceof ApiProblem && error.status === 401) return null;
    throw error;
  }
}

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => fetchSession(signal),
  staleTime: 5 * 60_000,
});

export async function postSession(input: { email: string; password: string }): Promise<Session> {
  const session = await api<Session>('/api/session', { method: 'POST', body: input, withoutSession: true });
  setCsrfToken(session.csrfToken);
  return session;
}

/** For screens behind the sign-in, where a session is certain. */
export function useUser(): SessionUser {
  const { data } = useQuery(sessionQuery);
  if (!data) throw new Error('useUser is called outside the signed-in part of the page');
  return data.user;
}

export function actorOf(user: SessionUser): Actor {
  return {
    id: user.id,
    email: user.email,
    name: user.name,
    role: user.role,
    orgId: user.organisation.id,
    orgKind: user.role === 'contractor' ? 'contractor' : 'owner',
    orgName: user.organisation.name,
  };
}

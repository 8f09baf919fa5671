import type { QueryClient } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import { setCsrfToken } from '#src/lib/api/csrf-token.ts';
import { stopUploads } from '#src/lib/api/use-upload-queue.ts';
import { clearDrafts } from '#src/lib/session/drafts.ts';
import { sessionQuery } from '#src/lib/session/session.ts';

/** Ends the session and forgets everything that was fetched or typed: the next person at this screen sees nothing of it. */
export async function signOut(queryClient: QueryClient): Promise<void> {
  await api<void>('/api/session', { method: 'DELETE', withoutSession: true });
  forgetSession(queryClient);
}

export function forgetSession(queryClient: QueryClient): void {
  setCsrfToken(null);
  clearDrafts();
  stopUploads();
  queryClient.clear();
  queryClient.setQueryData(sessionQuery.queryKey, null);
}

import { useMutation } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { TrailVerification } from '#shared/generated/api-types.ts';

/** Reads the whole chain on the server, entry by entry. */
export function useVerifyTrail() {
  return useMutation({ mutationFn: () => api<TrailVerification>('/api/trail/verify') });
}

import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { Transmittal, TransmittalBody } from '#shared/generated/api-types.ts';

/** Asks for an as-built to be issued; the same request sent twice is issued once. */
export function useIssueTransmittal(): (body: TransmittalBody) => Promise<Transmittal> {
  const client = useQueryClient();
  const key = useRef<string | null>(null);
  return useCallback(
    async (body) => {
      key.current ??= newIdempotencyKey();
      try {
        const made = await api<Transmittal>('/api/transmittals', {
          method: 'POST',
          body,
          idempotencyKey: key.current,
        });
        client.setQueryData(['transmittals', 'one', made.id], made);
        return made;
      } finally {
        // What comes next, after a refusal or a success, is another request.
        key.current = null;
        await client.invalidateQueries({ queryKey: ['transmittals', 'list'] });
      }
    },
    [client],
  );
}

import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { Transmittal, TransmittalBody } from '#shared/generated/api-types.ts';

/** Asks for an as-built to be issued. Sent again after no answer came, it is issued once; after an answer it is another one. */
export function useIssueTransmittal(): (body: TransmittalBody) => Promise<Transmittal> {
  const client = useQueryClient();
  const intent = useRef({ text: '', key: '' });
  return useCallback(
    async (body) => {
      const text = JSON.stringify(body);
      if (intent.current.text !== text) intent.current = { text, key: newIdempotencyKey() };
      const made = await api<Transmittal>('/api/transmittals', {
        method: 'POST',
        body,
        idempotencyKey: intent.current.key,
      });
      intent.current = { text: '', key: '' };
      client.setQueryData(['transmittals', 'one', made.id], made);
      await client.invalidateQueries({ queryKey: ['transmittals', 'list'] });
      return made;
    },
    [client],
  );
}

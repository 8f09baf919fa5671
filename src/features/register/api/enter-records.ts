import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { RegisterEntriesBody, RegisterEntriesReply } from '#shared/generated/api-types.ts';

/** Enters approved lines. The same lines and reason sent twice are entered once. */
export function useEnterRecords(): (body: RegisterEntriesBody) => Promise<RegisterEntriesReply> {
  const client = useQueryClient();
  const intent = useRef({ body: '', key: '' });
  return useCallback(
    async (body) => {
      const text = JSON.stringify(body);
      if (intent.current.body !== text) intent.current = { body: text, key: newIdempotencyKey() };
      const reply = await api<RegisterEntriesReply>('/api/register/entries', {
        method: 'POST',
        body,
        idempotencyKey: intent.current.key,
      });
      await Promise.all([
        client.invalidateQueries({ queryKey: ['register'] }),
        client.invalidateQueries({ queryKey: ['register-candidates'] }),
      ]);
      return reply;
    },
    [client],
  );
}

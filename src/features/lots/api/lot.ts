import { queryOptions, useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type { CreateLotBody, LotDetail, LotEventBody } from '#shared/generated/api-types.ts';

export const lotQuery = (id: string) =>
  queryOptions({
    queryKey: ['lots', 'one', id],
    queryFn: ({ signal }) => api<LotDetail>(`/api/lots/${id}`, { signal }),
  });

/** Enters a lot, or writes down what happened to one; sent again unchanged it counts once. */
export function useSendLot() {
  const client = useQueryClient();
  const intent = useRef({ text: '', key: '' });
  return useCallback(
    async (path: string, body: CreateLotBody | LotEventBody): Promise<LotDetail> => {
      const text = path + JSON.stringify(body);
      if (intent.current.text !== text) intent.current = { text, key: newIdempotencyKey() };
      const lot = await api<LotDetail>(path, { method: 'POST', body, idempotencyKey: intent.current.key });
      // Two receipts of the same size and count are two receipts.
      intent.current = { text: '', key: '' };
      client.setQueryData(lotQuery(lot.id).queryKey, lot);
      await client.invalidateQueries({ queryKey: ['lots', 'list'] });
      return lot;
    },
    [client],
  );
}

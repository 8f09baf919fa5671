import searchReply from '#schemas/api/search-reply.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import type { SearchReply } from '#shared/generated/api-types.ts';
import { search } from './search.ts';

export const searchRoutes: readonly Route[] = [
  defineRoute<{ query: { q: string }; reply: SearchReply }>({
    method: 'get',
    path: '/api/search',
    summary:
      'Structures, records, batches, orders, lots, concessions and transmittals by the beginning of their number',
    permission: 'signed-in',
    query: { q: { type: 'string', minLength: 1, maxLength: 80 } },
    reply: searchReply,
    handler: async ({ em, query, ability }) => ({
      items: query.q?.trim() ? await search(em, { q: query.q, ability }) : [],
    }),
  }),
];

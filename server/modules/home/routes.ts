import { defineRoute, type Route } from '#server/http/define-route.ts';
import { recentFor } from '#server/modules/home/recent.ts';
import { waitingFor } from '#server/modules/home/waiting-for.ts';
import homeSchema from '#schemas/api/home.schema.json' with { type: 'json' };
import type { Home } from '#shared/generated/api-types.ts';

export const homeRoutes: readonly Route[] = [
  defineRoute<{ reply: Home }>({
    method: 'get',
    path: '/api/home',
    summary: 'What waits for me, and what happened last',
    permission: 'signed-in',
    reply: homeSchema,
    handler: async ({ em, actor }) => ({
      items: await waitingFor(em, actor),
      recent: await recentFor(em, actor),
    }),
  }),
];

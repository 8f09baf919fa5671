import { defineRoute, type Route } from '#server/http/define-route.ts';
import { sendEvents } from './send-events.ts';

export const eventRoutes: readonly Route[] = [
  defineRoute<{ query: { subject?: string } }>({
    method: 'get',
    path: '/api/events',
    summary: 'Follow a long action: its progress at once and at every change, as server-sent events',
    permission: 'signed-in',
    query: { subject: { type: 'string', minLength: 1, maxLength: 80 } },
    raw: true,
    produces: 'text/event-stream',
    handler: async (ctx) => sendEvents(ctx),
  }),
];

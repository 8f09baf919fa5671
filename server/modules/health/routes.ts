import { defineRoute, type Route } from '#server/http/define-route.ts';
import { problem } from '#server/http/problem.ts';

export const healthRoutes: readonly Route[] = [
  defineRoute<{ reply: { status: 'ok' } }>({
    method: 'get',
    path: '/healthz',
    summary: 'The process answers',
    permission: 'public',
    handler: async () => ({ status: 'ok' }),
  }),
  defineRoute<{ reply: { status: 'ready' } }>({
    method: 'get',
    path: '/readyz',
    summary: 'The process can serve: it is not stopping and reaches its database',
    permission: 'public',
    handler: async ({ services, req }) => {
      if (req.app.locals.stopping) throw problem(503, 'stopping', 'This process is stopping.');
      await services.pool.query('select 1');
      return { status: 'ready' };
    },
  }),
];

import compression from 'compression';
import express, { type Express } from 'express';
import { createPassport } from '#server/auth/create-passport.ts';
import { createSession } from '#server/auth/create-session.ts';
import { endOldSession } from '#server/auth/end-old-session.ts';
import type { Services } from '#server/container.ts';
import { checkHost } from '#server/http/check-host.ts';
import { checkOrigin } from '#server/http/check-origin.ts';
import { errorHandler } from '#server/http/error-handler.ts';
import { logRequests } from '#server/http/log-requests.ts';
import { mountRoutes } from '#server/http/mount-routes.ts';
import { notFound } from '#server/http/problem.ts';
import { ROUTES } from '#server/http/routes.ts';
import { securityHeaders } from '#server/http/security-headers.ts';
import { serveClient } from '#server/http/serve-client.ts';

/** The whole server without a port. `stop` ends the timers of the session store; the services are the caller's. */
export function createApp(services: Services): { app: Express; stop(): void } {
  const { config, log } = services;
  const app = express();
  const session = createSession(services);
  const auth = createPassport(services);
  app.set('trust proxy', config.trustedProxies);
  app.set('etag', false);
  app.disable('x-powered-by');
  app.locals.auth = auth;

  app.use(logRequests(log));
  app.use(securityHeaders(config.publicUrl));
  // Health is asked by address, from inside: it has no Host of ours, and says nothing.
  app.use(/^(?!\/(?:healthz|readyz)$)/, checkHost(services));
  app.use(
    compression({
      filter: (req, res) =>
        !String(res.getHeader('content-type')).startsWith('text/event-stream') &&
        compression.filter(req, res),
    }),
  );
  app.use('/api', (_req, res, next) => {
    res.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', checkOrigin(services));
  app.use('/api', session.middleware, endOldSession(config.signIn.absoluteHours), auth.session());

  mountRoutes(app, ROUTES, services);
  app.use('/api', () => {
    throw notFound();
  });
  app.use(serveClient());
  app.use(() => {
    throw notFound();
  });
  app.use(errorHandler(log));
  return { app, stop: () => session.stop() };
}

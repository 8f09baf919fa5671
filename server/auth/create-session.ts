import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';
import type { RequestHandler } from 'express';
import '#server/auth/session-types.ts';
import type { Services } from '#server/container.ts';

/**
 * Sessions in PostgreSQL. The cookie has no end of its own: the idle end stands in the row and every request
 * moves it, the absolute end is `signedInAt`, so that neither can be changed from the browser.
 */
export function createSession({ config, pool, log }: Services): {
  middleware: RequestHandler;
  stop: () => void;
} {
  const secure = config.publicUrl.startsWith('https:');
  const PgStore = connectPgSimple(session);
  const store = new PgStore({
    pool,
    tableName: 'sessions',
    ttl: config.signIn.idleMinutes * 60,
    pruneSessionInterval: 15 * 60,
    errorLog: (...args: unknown[]) => log.error({ args: args.map(String) }, 'session store'),
  });
  const middleware = session({
    store,
    secret: config.sessionSecret,
    // `__Host-` keeps the cookie to this host and to TLS; browsers refuse the name without both.
    name: secure ? '__Host-upstand' : 'upstand',
    resave: false,
    saveUninitialized: false,
    proxy: config.trustedProxies > 0,
    cookie: { httpOnly: true, sameSite: 'lax', secure, path: '/' },
  });
  return { middleware, stop: () => store.close() };
}

import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** A reset link is as good as a password for an hour: its token stays out of the log. */
export function withoutToken(url: string): string {
  return url.replace(/(\/(?:api\/password-resets|password-reset)\/)[^/?#]+/, '$1[token]');
}

/** One line a request, without cookies, tokens or bodies. */
export function logRequests(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: () => randomUUID(),
    quietReqLogger: true,
    autoLogging: { ignore: (req) => req.url === '/healthz' || req.url === '/readyz' },
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? 'error' : 'info'),
    serializers: {
      req: (req: { id: string; method: string; url: string; remoteAddress?: string }) => ({
        id: req.id,
        method: req.method,
        url: withoutToken(req.url),
        remoteAddress: req.remoteAddress,
      }),
      res: (res: { statusCode: number }) => ({ statusCode: res.statusCode }),
    },
  });
}

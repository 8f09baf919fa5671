import type { RequestHandler } from 'express';
import type { Services } from '#server/container.ts';
import { problem } from '#server/http/problem.ts';
import { recordRefusal } from '#server/http/record-refusal.ts';

const LOOPBACK = new Set(['localhost', '127.0.0.1', '[::1]']);

function hostName(header: string): string | null {
  const address = `http://${header}`;
  if (!URL.canParse(address)) return null;
  const { hostname, username, password, pathname } = new URL(address);
  return username || password || pathname !== '/' ? null : hostname;
}

/** A name that points at this server but is not its own is how a page elsewhere reaches a loopback address. */
export function checkHost(services: Services): RequestHandler {
  const own = new URL(services.config.publicUrl).hostname;
  return async (req, _res, next) => {
    const name = hostName(req.headers.host ?? '');
    if (name !== null && (LOOPBACK.has(name) || name === own)) {
      next();
      return;
    }
    await recordRefusal(services, {
      req,
      actor: null,
      action: 'host',
      code: 'host.foreign',
      subject: req.headers.host,
    });
    throw problem(
      421,
      'host.foreign',
      'This server does not answer under that name. Open the address it was given.',
    );
  };
}

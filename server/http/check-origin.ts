import type { RequestHandler } from 'express';
import type { Services } from '#server/container.ts';
import { problem } from '#server/http/problem.ts';
import { recordRefusal } from '#server/http/record-refusal.ts';

/**
 * Refuses what a page of another origin sends. No Origin at all is let through: scripts and old browsers send none,
 * and a write needs the CSRF token besides.
 */
export function checkOrigin(services: Services): RequestHandler {
  const own = new URL(services.config.publicUrl).origin;
  return async (req, _res, next) => {
    const { origin } = req.headers;
    // The Host was checked before this: an origin equal to it is this server under another of its names.
    if (origin === undefined || origin === own || origin === `${req.protocol}://${req.headers.host}`) {
      next();
      return;
    }
    await recordRefusal(services, {
      req,
      actor: null,
      action: 'origin',
      code: 'origin.foreign',
      subject: origin,
    });
    throw problem(
      403,
      'origin.foreign',
      'This request came from a page of another site and was not carried out.',
    );
  };
}

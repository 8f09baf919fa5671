import type { RequestHandler } from 'express';

/** Ends a session at its absolute age, however busy it is. Runs before Passport reads who it belongs to. */
export function endOldSession(absoluteHours: number): RequestHandler {
  return (req, _res, next) => {
    const { signedInAt } = req.session;
    if (signedInAt === undefined || Date.now() - signedInAt < absoluteHours * 3_600_000) {
      next();
      return;
    }
    req.session.regenerate(next);
  };
}

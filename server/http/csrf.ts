import { randomBytes, timingSafeEqual } from 'node:crypto';
import type { Request } from 'express';
import { problem } from '#server/http/problem.ts';

export function createCsrfToken(): string {
  return randomBytes(32).toString('base64url');
}

/**
 * Compares `X-CSRF-Token` with the token kept in the session.
 * @throws Problem 403 when it is missing or another
 */
export function requireCsrfToken(req: Request): void {
  const expected = Buffer.from(req.session.csrfToken ?? '');
  const given = Buffer.from(req.get('x-csrf-token') ?? '');
  if (expected.length > 0 && expected.length === given.length && timingSafeEqual(expected, given)) return;
  throw problem(
    403,
    'csrf.missing',
    'This change did not come with the proof that it was asked for on this site. Reload the page and try again.',
  );
}

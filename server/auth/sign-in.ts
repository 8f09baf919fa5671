import type { Request, Response } from 'express';
import type passport from 'passport';
import { createCsrfToken } from '#server/http/csrf.ts';
import { problem } from '#server/http/problem.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/**
 * Checks address and password through Passport, then starts a new session (a session id known before sign-in is
 * worth nothing after it) and saves it before the answer goes out.
 * @throws Problem 401, 429
 */
export async function signIn(auth: passport.Authenticator, req: Request, res: Response): Promise<Actor> {
  const actor = await new Promise<Actor>((resolve, reject) => {
    const done = (error: unknown, user?: Express.User | false | null): void => {
      if (error) reject(error as Error);
      else if (user) resolve(user);
      else reject(problem(401, 'sign-in.wrong', 'The e-mail address or the password is not right.'));
    };
    const authenticate = auth.authenticate('local', done) as (
      req: Request,
      res: Response,
      next: typeof done,
    ) => void;
    authenticate(req, res, done);
  });
  await new Promise<void>((resolve, reject) => {
    req.login(actor, (error?: unknown) => (error ? reject(error as Error) : resolve()));
  });
  req.session.csrfToken = createCsrfToken();
  req.session.signedInAt = Date.now();
  await new Promise<void>((resolve, reject) => {
    req.session.save((error?: unknown) => (error ? reject(error as Error) : resolve()));
  });
  return actor;
}

export async function signOut(req: Request): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    req.session.destroy((error?: unknown) => (error ? reject(error as Error) : resolve()));
  });
}

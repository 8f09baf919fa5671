import passport from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import { findActiveActor } from '#server/auth/find-actor.ts';
import { verifySignIn } from '#server/auth/verify-sign-in.ts';
import type { Services } from '#server/container.ts';

/** One Passport per app, not the module's own: two apps in one process (tests) must not share strategies. */
export function createPassport(services: Services): passport.Authenticator {
  const auth = new passport.Passport();
  auth.use(
    new LocalStrategy(
      { usernameField: 'email', passwordField: 'password', passReqToCallback: true, session: false },
      (req, email, password, done) => {
        verifySignIn(services, { req, email, password }).then(
          (actor) => done(null, actor),
          (error: unknown) => done(error),
        );
      },
    ),
  );
  auth.serializeUser((user, done) => done(null, user.id));
  auth.deserializeUser((id: string, done) => {
    findActiveActor(services.pool, id).then(
      (actor) => done(null, actor ?? false),
      (error: unknown) => done(error),
    );
  });
  return auth;
}

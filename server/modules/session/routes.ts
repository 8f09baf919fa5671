import type passport from 'passport';
import { signIn, signOut } from '#server/auth/sign-in.ts';
import { run } from '#server/db/rows.ts';
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { notSignedIn } from '#server/http/problem.ts';
import { abilityOf } from '#server/http/request-context.ts';
import { appInfo } from '#server/modules/session/app-info.ts';
import { presentSession } from '#server/modules/session/present-session.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import appInfoSchema from '#schemas/api/app-info.schema.json' with { type: 'json' };
import sessionSchema from '#schemas/api/session.schema.json' with { type: 'json' };
import signInSchema from '#schemas/api/sign-in.schema.json' with { type: 'json' };
import type { AppInfo, Session, SignIn } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

const subjectOf = (actor: Actor) => ({ type: 'person', id: actor.id, label: actor.name });

export const sessionRoutes: readonly Route[] = [
  defineRoute<{ params: object; reply: AppInfo }>({
    method: 'get',
    path: '/api/app',
    summary: 'What the sign-in page needs to know',
    permission: 'public',
    reply: appInfoSchema,
    handler: (ctx) => appInfo(ctx as never),
  }),
  defineRoute<{ body: SignIn; reply: Session }>({
    method: 'post',
    path: '/api/session',
    summary: 'Sign in',
    permission: 'public',
    body: signInSchema,
    reply: sessionSchema,
    handler: async ({ em, req, res }) => {
      const actor = await signIn(req.app.locals.auth as passport.Authenticator, req, res);
      await em.transactional(async (tx) => {
        await run(tx, 'update users set last_sign_in_at = now() where id = $1', [actor.id]);
        await appendTrail(tx, { actor, action: 'session.signed-in', subject: subjectOf(actor) });
      });
      return presentSession({ actor, ability: abilityOf(actor), csrfToken: req.session.csrfToken ?? '' });
    },
  }),
  defineRoute<{ reply: Session }>({
    method: 'get',
    path: '/api/session',
    summary: 'Who is signed in, and what they may do',
    permission: 'signed-in',
    reply: sessionSchema,
    handler: async ({ actor, ability, req }) => {
      const { csrfToken } = req.session;
      if (!csrfToken) throw notSignedIn();
      return presentSession({ actor, ability, csrfToken });
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/session',
    summary: 'Sign out',
    permission: 'signed-in',
    handler: async ({ actor, em, req, res }) => {
      await signOut(req);
      res.clearCookie('upstand').clearCookie('__Host-upstand', { secure: true });
      await em.transactional((tx) =>
        appendTrail(tx, { actor, action: 'session.signed-out', subject: subjectOf(actor) }),
      );
    },
  }),
];

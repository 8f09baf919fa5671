import { defineRoute, type Route } from '#server/http/define-route.ts';
import { requestReset } from '#server/modules/people/request-reset.ts';
import { requireToken, setPassword } from '#server/modules/people/set-password.ts';
import passwordResetSchema from '#schemas/api/password-reset.schema.json' with { type: 'json' };
import linkSchema from '#schemas/api/password-reset-link.schema.json' with { type: 'json' };
import requestSchema from '#schemas/api/password-reset-request.schema.json' with { type: 'json' };
import type { PasswordReset, PasswordResetLink, PasswordResetRequest } from '#shared/generated/api-types.ts';

const TOKEN = { type: 'string', pattern: '^[A-Za-z0-9_-]{20,100}$' };

/** Public, and safe without a CSRF token: the token in the address is the proof. */
export const passwordRoutes: readonly Route[] = [
  defineRoute<{ body: PasswordResetRequest }>({
    method: 'post',
    path: '/api/password-resets',
    summary: 'Ask for a link to choose a new password; the answer is the same for an unknown address',
    permission: 'public',
    body: requestSchema,
    status: 202,
    handler: ({ em, services, req, body }) => requestReset({ em, services, req, email: body.email }),
  }),
  defineRoute<{ params: { token: string }; reply: PasswordResetLink }>({
    method: 'get',
    path: '/api/password-resets/:token',
    summary: 'Whom a link belongs to; 410 when it no longer works',
    permission: 'public',
    params: { token: TOKEN },
    reply: linkSchema,
    handler: async ({ em, params }) => {
      const { email, purpose } = await requireToken(em, params.token);
      return { email, purpose };
    },
  }),
  defineRoute<{ params: { token: string }; body: PasswordReset }>({
    method: 'put',
    path: '/api/password-resets/:token',
    summary: 'Choose a new password; every session of the account ends',
    permission: 'public',
    params: { token: TOKEN },
    body: passwordResetSchema,
    handler: ({ em, services, params, body }) =>
      setPassword({ em, services, token: params.token, password: body.password }),
  }),
];

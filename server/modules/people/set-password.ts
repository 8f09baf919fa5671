import type { EntityManager } from '@mikro-orm/postgresql';
import { endSessionsOf } from '#server/auth/end-sessions.ts';
import { hashPassword } from '#server/auth/hash-password.ts';
import { passwordFault } from '#server/auth/password-rules.ts';
import { clearAttempts } from '#server/auth/throttle.ts';
import { findToken, useToken, type TokenOwner } from '#server/auth/tokens.ts';
import { run } from '#server/db/rows.ts';
import type { Services } from '#server/container.ts';
import { problem, type Problem } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';

function unusable(): Problem {
  return problem(
    410,
    'token.unusable',
    'This link was used already, was replaced by a newer one, or has run out. Ask for a new one on the sign-in page.',
  );
}

/** @throws Problem 410 */
export async function requireToken(em: EntityManager, token: string): Promise<TokenOwner> {
  const owner = await findToken(em, token);
  if (!owner) throw unusable();
  return owner;
}

/**
 * Sets the password that a link was sent for and ends every session of the account. A password that is refused
 * leaves the link good.
 * @throws Problem 410, 422 pointing at the password
 */
export async function setPassword(options: {
  em: EntityManager;
  services: Services;
  token: string;
  password: string;
}): Promise<void> {
  const { em, services, token, password } = options;
  const owner = await requireToken(em, token);
  const fault = passwordFault(password, owner.email);
  if (fault) {
    throw problem(422, 'password.weak', fault, {
      errors: [{ pointer: '/password', code: 'weak', detail: fault }],
    });
  }
  const hash = await hashPassword(password);
  const { userId } = owner;
  await em.transactional(async (tx) => {
    if (!(await useToken(tx, { token, userId }))) throw unusable();
    await run(tx, 'update users set password_hash = $2, version = version + 1 where id = $1', [userId, hash]);
    await endSessionsOf(tx, userId);
    await appendTrail(tx, {
      actor: null,
      action: 'person.password-set',
      subject: { type: 'person', id: userId, label: owner.name },
      payload: { by: owner.purpose },
    });
  });
  await clearAttempts(services.pool, `account:${owner.email.toLowerCase()}`);
}

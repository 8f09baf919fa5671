import type { Request } from 'express';
import type { Services } from '#server/container.ts';
import { findAccountByEmail } from '#server/auth/find-actor.ts';
import { verifyPassword } from '#server/auth/hash-password.ts';
import { clearAttempts, countAttempt, forgiveAttempt, type Throttle } from '#server/auth/throttle.ts';
import { problem, type Problem } from '#server/http/problem.ts';
import { recordRefusal } from '#server/http/record-refusal.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** One answer for an unknown address, a wrong password and an account that is closed. */
function wrong(): Problem {
  return problem(
    401,
    'sign-in.wrong',
    'The e-mail address or the password is not right. Check both and try again, or ask for a new password.',
  );
}

function tooMany(waitSeconds: number): Problem {
  const minutes = Math.ceil(waitSeconds / 60);
  return problem(
    429,
    'sign-in.throttled',
    `Too many attempts to sign in. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`} and try again, or ask for a new password.`,
    { headers: { 'Retry-After': String(waitSeconds) } },
  );
}

/**
 * @throws Problem 401 `sign-in.wrong`, 429 `sign-in.throttled` with Retry-After
 */
export async function verifySignIn(
  services: Services,
  { req, email, password }: { req: Request; email: string; password: string },
): Promise<Actor> {
  const { pool, config } = services;
  const { windowMinutes, failuresPerAccount, failuresPerAddress } = config.signIn;
  const account: Throttle = {
    key: `account:${email.trim().toLowerCase()}`,
    limit: failuresPerAccount,
    windowMinutes,
  };
  const address: Throttle = {
    key: `address:${req.ip ?? 'unknown'}`,
    limit: failuresPerAddress,
    windowMinutes,
  };

  const counted = [await countAttempt(pool, address), await countAttempt(pool, account)];
  const waits = counted.flatMap(({ waitSeconds }) => waitSeconds ?? []);
  if (waits.length > 0) {
    // Only the first beyond the limit is kept: a flood must not fill the table.
    if (
      counted.some(
        ({ count, waitSeconds }, index) => waitSeconds && count === [address, account][index]!.limit + 1,
      )
    ) {
      await recordRefusal(services, {
        req,
        actor: null,
        action: 'sign-in',
        code: 'sign-in.throttled',
        email,
      });
    }
    throw tooMany(Math.max(...waits));
  }

  const found = await findAccountByEmail(pool, email);
  const right = await verifyPassword(found?.passwordHash ?? null, password);
  if (!found || !right || !found.active) {
    await recordRefusal(services, { req, actor: null, action: 'sign-in', code: 'sign-in.wrong', email });
    throw wrong();
  }
  await clearAttempts(pool, account.key);
  await forgiveAttempt(pool, address);
  return found.actor;
}

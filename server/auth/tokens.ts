import { createHash, randomBytes } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';

export type TokenPurpose = 'invitation' | 'password-reset';
export type TokenOwner = { userId: string; email: string; name: string; purpose: TokenPurpose };

const HOURS: Readonly<Record<TokenPurpose, number>> = { invitation: 7 * 24, 'password-reset': 1 };

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

/** Makes a link's token; only its hash is kept, and a newer one makes the older ones of its purpose worthless. */
export async function issueToken(
  em: EntityManager,
  { userId, purpose }: { userId: string; purpose: TokenPurpose },
): Promise<{ token: string; hash: string; hours: number }> {
  const token = randomBytes(32).toString('base64url');
  const hash = hashOf(token);
  await run(em, 'update tokens set used_at = now() where user_id = $1 and purpose = $2 and used_at is null', [
    userId,
    purpose,
  ]);
  await run(
    em,
    `insert into tokens (hash, user_id, purpose, expires_at) values ($1, $2, $3, now() + make_interval(hours => $4))`,
    [hash, userId, purpose, HOURS[purpose]],
  );
  return { token, hash, hours: HOURS[purpose] };
}

/** Whose token this is; null when it is unknown, used, run out, or its account is closed. */
export async function findToken(em: EntityManager, token: string): Promise<TokenOwner | null> {
  return row<TokenOwner>(
    em,
    `select u.id as "userId", u.email, u.name, t.purpose from tokens t join users u on u.id = t.user_id
     where t.hash = $1 and t.used_at is null and t.expires_at > now() and u.active`,
    [hashOf(token)],
  );
}

/** Uses the token up, with every other one of the account; false when somebody else was first. */
export async function useToken(
  em: EntityManager,
  { token, userId }: { token: string; userId: string },
): Promise<boolean> {
  const used = await run(
    em,
    'update tokens set used_at = now() where hash = $1 and used_at is null and expires_at > now()',
    [hashOf(token)],
  );
  if (used === 0) return false;
  await run(em, 'update tokens set used_at = now() where user_id = $1 and used_at is null', [userId]);
  return true;
}

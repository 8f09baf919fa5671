import type { Request } from 'express';
import type { Services } from '#server/container.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** Rows of one caller and hour; a table that only grows must not be filled by whoever is refused most. */
const MOST_AN_HOUR = 100;
const LAST_KEPT = 'Further refusals of this caller in this hour are counted, not kept.';

/**
 * Keeps a refusal in its own table, on its own connection: outside the trail's lock and outside any transaction
 * that the refusal rolls back. Past a hundred of one caller in an hour they are counted only. A refusal that cannot be kept is logged; the caller is refused all the same.
 */
export async function recordRefusal(
  services: Services,
  refusal: {
    req: Request;
    actor: Actor | null;
    action: string;
    code: string;
    subject?: string | null;
    /** as typed, where nobody is signed in */
    email?: string | null;
  },
): Promise<void> {
  const { req, actor, action, code, subject = null, email = null } = refusal;
  try {
    await services.pool.query(
      `with counted as (
         insert into refusal_counts (key, window_start, n) values ($7, date_trunc('hour', now()), 1)
         on conflict (key, window_start) do update set n = refusal_counts.n + 1 returning n
       )
       insert into refusals (user_id, email, address, action, subject, code, detail)
       select $1::uuid, $2, $3, $4, $5, $6, case when n = $8 then $9 end from counted where n <= $8`,
      [
        actor?.id ?? null,
        printable(email ?? actor?.email ?? null),
        req.ip ?? null,
        action,
        printable(subject),
        code,
        actor ? `account:${actor.id}` : `address:${req.ip ?? 'unknown'}`,
        MOST_AN_HOUR,
        LAST_KEPT,
      ],
    );
  } catch (error) {
    services.log.error({ err: error, action, code }, 'a refusal could not be kept');
  }
}

/** What a stranger typed, cut to a line that PostgreSQL can keep. */
function printable(text: string | null): string | null {
  return text === null ? null : text.replaceAll('\0', '').slice(0, 300);
}

import type { Request } from 'express';
import type { Services } from '#server/container.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/**
 * Keeps a refusal in its own table, on its own connection: outside the trail's lock and outside any transaction
 * that the refusal rolls back. A refusal that cannot be kept is logged; the caller is refused all the same.
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
      'insert into refusals (user_id, email, address, action, subject, code) values ($1, $2, $3, $4, $5, $6)',
      [
        actor?.id ?? null,
        printable(email ?? actor?.email ?? null),
        req.ip ?? null,
        action,
        printable(subject),
        code,
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

import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { Recipient } from '#server/mail/queue-mail.ts';
import type { Role } from '#shared/permissions/ability.ts';

/** The active people of an organisation, or of a role of the owner's, in the order of their addresses. */
export function recipients(
  em: EntityManager,
  whom:
    | { readonly orgId: string }
    | { readonly role: Exclude<Role, 'contractor'> }
    | { readonly userIds: readonly string[] },
): Promise<Recipient[]> {
  const { orgId, role, userIds } = { orgId: null, role: null, userIds: null, ...whom };
  return rows<Recipient & Record<string, string>>(
    em,
    `select name, email as address from users
     where active and ($1::uuid is null or org_id = $1) and ($2::text is null or role = $2)
       and ($3::uuid[] is null or id = any($3)) order by lower(email)`,
    [orgId, role, userIds],
  );
}

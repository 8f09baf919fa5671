import type { EntityManager } from '@mikro-orm/postgresql';
import type { Config } from '#server/config/config.ts';
import { row } from '#server/db/rows.ts';
import { conflict, problem } from '#server/http/problem.ts';
import { sendLink } from '#server/modules/people/send-link.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor, Role } from '#shared/permissions/ability.ts';
import type { PersonNew } from '#shared/generated/api-types.ts';

/** @throws Problem 422 where role and organisation do not go together */
export function requireFittingRole(role: Role, kind: 'owner' | 'contractor'): void {
  if ((role === 'contractor') === (kind === 'contractor')) return;
  const detail =
    kind === 'contractor'
      ? 'People of a contractor can only be contractors. Choose that role, or the owner’s organisation.'
      : 'A contractor must belong to a contractor’s organisation. Choose another role or organisation.';
  throw problem(422, 'person.role', detail, { errors: [{ pointer: '/role', code: 'role', detail }] });
}

/**
 * Makes the account and sends its invitation, in one transaction.
 * @throws Problem 422 unknown organisation or a role that does not fit it, 409 address already known
 */
export async function invitePerson(
  em: EntityManager,
  { actor, config, input }: { actor: Actor; config: Config; input: PersonNew },
): Promise<string> {
  return em.transactional(async (tx) => {
    const organisation = await row<{ kind: 'owner' | 'contractor' }>(
      tx,
      'select kind from organisations where id = $1',
      [input.organisationId],
    );
    if (!organisation) {
      const detail = 'There is no such organisation. Choose one from the list.';
      throw problem(422, 'person.organisation', detail, {
        errors: [{ pointer: '/organisationId', code: 'organisation', detail }],
      });
    }
    requireFittingRole(input.role, organisation.kind);
    const person = { name: input.name.trim(), email: input.email.trim().toLowerCase() };
    const made = await row<{ id: string }>(
      tx,
      `insert into users (org_id, role, email, name) values ($1, $2, $3, $4)
       on conflict (lower(email)) do nothing returning id`,
      [input.organisationId, input.role, person.email, person.name],
    );
    if (!made) {
      const detail = 'Somebody with this address is already here. Look for them in the list.';
      throw conflict('person.email-taken', detail, {
        errors: [{ pointer: '/email', code: 'taken', detail }],
      });
    }
    await sendLink(tx, { config, person: { id: made.id, ...person }, purpose: 'invitation' });
    await appendTrail(tx, {
      actor,
      action: 'person.invited',
      subject: { type: 'person', id: made.id, label: person.name },
      payload: { email: person.email, role: input.role, organisationId: input.organisationId },
    });
    return made.id;
  });
}

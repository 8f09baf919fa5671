import type { EntityManager } from '@mikro-orm/postgresql';
import { endSessionsOf } from '#server/auth/end-sessions.ts';
import { row, run } from '#server/db/rows.ts';
import { conflict, stale } from '#server/http/problem.ts';
import { requireFittingRole } from '#server/modules/people/invite-person.ts';
import { readPerson } from '#server/modules/people/read-people.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import type { PersonChange } from '#shared/generated/api-types.ts';

/**
 * Changes name, role or whether the account is open. A person whose role changed or whose account was closed is
 * signed out everywhere.
 * @throws Problem 404, 412 with the newer state, 422 role, 409 one's own role or account
 */
export async function changePerson(
  em: EntityManager,
  options: { actor: Actor; ability: Ability; id: string; version: number; input: PersonChange },
): Promise<void> {
  const { actor, ability, id, version, input } = options;
  await em.transactional(async (tx) => {
    await row(tx, 'select id from users where id = $1 for update', [id]);
    const before = await readPerson(tx, id, ability);
    if (before.version !== version) throw stale(before);
    const after = {
      name: input.name?.trim() ?? before.name,
      role: input.role ?? before.role,
      active: input.active ?? before.active,
    };
    const sameRights = after.role === before.role && after.active === before.active;
    // Nobody can take the last administrator away, since that would have to be themselves.
    if (!sameRights && id === actor.id) {
      throw conflict(
        'person.self',
        'You cannot change your own role or close your own account. Ask another administrator.',
      );
    }
    requireFittingRole(after.role, before.organisation.kind);
    await run(tx, 'update users set name = $2, role = $3, active = $4, version = version + 1 where id = $1', [
      id,
      after.name,
      after.role,
      after.active,
    ]);
    if (!sameRights) await endSessionsOf(tx, id);
    await appendTrail(tx, {
      actor,
      action: 'person.changed',
      subject: { type: 'person', id, label: after.name },
      payload: { before: { name: before.name, role: before.role, active: before.active }, after },
    });
  });
}

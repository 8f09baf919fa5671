import type { EntityManager } from '@mikro-orm/postgresql';
import type { Config } from '#server/config/config.ts';
import { conflict } from '#server/http/problem.ts';
import { readPerson } from '#server/modules/people/read-people.ts';
import { sendLink } from '#server/modules/people/send-link.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';

/** Sends a fresh invitation; the link of the one before stops working. @throws Problem 404, 409 */
export async function inviteAgain(
  em: EntityManager,
  { actor, ability, config, id }: { actor: Actor; ability: Ability; config: Config; id: string },
): Promise<void> {
  await em.transactional(async (tx) => {
    const person = await readPerson(tx, id, ability);
    if (!person.can.includes('invite')) {
      throw conflict(
        'person.not-invited',
        'This person has already chosen a password, or their account is closed.',
      );
    }
    await sendLink(tx, { config, person, purpose: 'invitation' });
    await appendTrail(tx, {
      actor,
      action: 'person.invited-again',
      subject: { type: 'person', id, label: person.name },
    });
  });
}

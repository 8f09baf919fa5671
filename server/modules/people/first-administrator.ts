import type { EntityManager } from '@mikro-orm/postgresql';
import { issueToken } from '#server/auth/tokens.ts';
import { row, rows } from '#server/db/rows.ts';
import { conflict } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';

/**
 * The owner's organisation and its first administrator on an empty installation; from there on people are invited.
 * @returns the token of the link that sets the password, and for how many hours it is good
 * @throws Problem 409 when there is an administrator already, or the address is known
 */
export async function firstAdministrator(
  em: EntityManager,
  person: { owner: string; name: string; email: string },
): Promise<{ token: string; hours: number }> {
  return em.transactional(async (tx) => {
    // Two at once would make two first administrators.
    await rows(tx, `select pg_advisory_xact_lock(hashtext('first-administrator'))`);
    if (await row(tx, `select 1 from users where role = 'administrator' and active limit 1`))
      throw conflict(
        'administrator.exists',
        'There is an administrator already. People are invited from the product.',
      );
    const owner =
      (await row<{ id: string }>(
        tx,
        `select id from organisations where kind = 'owner' order by created_at limit 1`,
      )) ??
      (await row<{ id: string }>(
        tx,
        `insert into organisations (kind, name) values ('owner', $1) returning id`,
        [person.owner],
      ));
    const made = await row<{ id: string }>(
      tx,
      `insert into users (org_id, role, email, name) values ($1, 'administrator', $2, $3)
       on conflict (lower(email)) do nothing returning id`,
      [owner?.id, person.email.trim().toLowerCase(), person.name.trim()],
    );
    if (!made) throw conflict('person.email-taken', 'Somebody with this address is already here.');
    await appendTrail(tx, {
      actor: null,
      action: 'person.invited',
      subject: { type: 'person', id: made.id, label: person.name },
      payload: { email: person.email, role: 'administrator', first: true },
    });
    const { token, hours } = await issueToken(tx, { userId: made.id, purpose: 'invitation' });
    return { token, hours };
  });
}

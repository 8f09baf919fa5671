import type { EntityManager } from '@mikro-orm/postgresql';
import { issueToken, type TokenPurpose } from '#server/auth/tokens.ts';
import type { Config } from '#server/config/config.ts';
import { row } from '#server/db/rows.ts';
import { queueMail } from '#server/mail/queue-mail.ts';

/** Issues a token and queues the message with its link, in em's transaction. */
export async function sendLink(
  em: EntityManager,
  options: { config: Config; person: { id: string; name: string; email: string }; purpose: TokenPurpose },
): Promise<void> {
  const { config, person, purpose } = options;
  const { token, hash, hours } = await issueToken(em, { userId: person.id, purpose });
  const owner = await row<{ name: string }>(
    em,
    `select name from organisations where kind = 'owner' order by created_at, id limit 1`,
  );
  await queueMail(em, {
    event: `${purpose}:${hash}`,
    recipient: { name: person.name, address: person.email },
    template: purpose,
    data: {
      name: person.name,
      owner: owner?.name ?? '',
      link: `${config.publicUrl}/password-reset/${token}`,
      validFor: hours >= 48 ? `${hours / 24} days` : hours === 1 ? 'one hour' : `${hours} hours`,
    },
  });
}

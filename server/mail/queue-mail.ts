import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import type { MailData, MailTemplate } from '#server/mail/mail-templates.ts';
import { sendMailJob } from '#server/mail/send-mail.job.ts';

export type Recipient = { readonly name: string; readonly address: string };

/**
 * Writes a message into the outbox and its job on the queue, in em's transaction. `event` names what happened once and
 * for all, like `batch.returned:<revision id>`: the same event to the same recipient by the same template is one message.
 */
export async function queueMail<T extends MailTemplate>(
  em: EntityManager,
  mail: {
    readonly event: string;
    readonly recipient: Recipient;
    readonly template: T;
    readonly data: MailData[T];
  },
): Promise<void> {
  const [written] = await rows<{ id: string }>(
    em,
    `insert into outbox (event, recipient, recipient_name, template, data, message_id) values ($1, lower($2), $3, $4, $5, $6)
     on conflict (event, recipient, template) do nothing returning id`,
    [
      mail.event,
      mail.recipient.address,
      mail.recipient.name,
      mail.template,
      JSON.stringify(mail.data),
      `<${randomUUID()}@upstand.invalid>`,
    ],
  );
  if (written !== undefined) await enqueue(em, sendMailJob, { outboxId: written.id });
}

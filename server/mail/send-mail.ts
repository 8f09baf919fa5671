import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { Hopeless } from '#server/jobs/hopeless.ts';
import { renderMail, type MailTemplate } from '#server/mail/mail-templates.ts';
import { createTransport } from '#server/mail/transport.ts';

type OutboxRow = {
  recipient: string;
  name: string;
  template: MailTemplate;
  data: never;
  messageId: string;
  state: 'queued' | 'sent' | 'failed';
};

/** At least once: a process that dies between the server's answer and our note of it sends again, under the same Message-ID. */
export const sendMail: JobHandler<{ outboxId: string }> = async ({ outboxId }, { services, em }) => {
  const found = await row<OutboxRow>(
    em,
    `select recipient, recipient_name as name, template, data, message_id as "messageId", state from outbox where id = $1`,
    [outboxId],
  );
  if (found === null || found.state === 'sent') return;
  const { config } = services;
  const transport = createTransport(config.smtpUrl);
  try {
    const { subject, text, html } = renderMail(found.template, found.data, { publicUrl: config.publicUrl });
    await transport.sendMail({
      from: { name: 'Upstand', address: config.mailFrom },
      to: { name: found.name, address: found.recipient },
      messageId: found.messageId,
      // Says to other servers' responders that nobody reads an answer to this.
      headers: { 'Auto-Submitted': 'auto-generated' },
      subject,
      text,
      html,
    });
  } catch (error) {
    await note(em, outboxId, error);
    throw isRefused(error) ? new Hopeless((error as Error).message, { cause: error }) : error;
  } finally {
    transport.close();
  }
  await run(
    em,
    // A sent link has done its work here: its token is nobody's business any more.
    `update outbox set state = 'sent', sent_at = now(), attempts = attempts + 1, last_error = null, data = data - 'link' where id = $1`,
    [outboxId],
  );
};

async function note(em: EntityManager, id: string, error: unknown): Promise<void> {
  const message = error instanceof Error ? error.message : String(error);
  await run(
    em,
    `update outbox set state = 'queued', attempts = attempts + 1, last_error = $2 where id = $1 and state <> 'sent'`,
    [id, message.slice(0, 1_000)],
  );
}

type SmtpError = { code?: unknown; responseCode?: unknown; command?: unknown };

/**
 * The server has said for good (RFC 5321 4.2.1: 5yz) that it does not take this message or this recipient. A refusal of
 * our sign-in or sender speaks of the settings, not of the message: once they are mended a repeat succeeds.
 */
function isRefused(error: unknown): boolean {
  const { code, responseCode, command } = error as SmtpError;
  return (
    (code === 'EENVELOPE' || code === 'EMESSAGE') &&
    typeof responseCode === 'number' &&
    responseCode >= 500 &&
    (command === 'RCPT TO' || command === 'DATA')
  );
}

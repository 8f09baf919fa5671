import type { EntityManager } from '@mikro-orm/postgresql';
import { readMessage, type MessageParts } from '#server/mail/read-message.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { storableText } from '#server/db/storable-text.ts';

export type CapturedSummary = {
  readonly id: string;
  readonly subject: string;
  readonly sender: string;
  readonly recipients: readonly string[];
  readonly at: string;
};
export type CapturedMessage = CapturedSummary & { readonly messageId: string | null } & Pick<
    MessageParts,
    'text' | 'html'
  >;

export async function storeCaptured(
  em: EntityManager,
  message: { readonly source: string; readonly sender: string; readonly recipients: readonly string[] },
): Promise<void> {
  const source = storableText(message.source);
  const { subject, headers } = readMessage(source);
  await run(
    em,
    `insert into captured_mail (message_id, sender, recipients, subject, source) values ($1, $2, $3, $4, $5)`,
    [headers.get('message-id') ?? null, message.sender, message.recipients, subject, source],
  );
}

/** Newest first. `before` is the last item of the page before. */
export function listCaptured(
  em: EntityManager,
  page: { readonly limit: number; readonly before?: { readonly at: string; readonly id: string } },
): Promise<CapturedSummary[]> {
  return rows<CapturedSummary>(
    em,
    `select id, subject, sender, recipients, at from captured_mail
     where $1::timestamptz is null or (at, id) < ($1, $2::uuid) order by at desc, id desc limit $3`,
    [page.before?.at ?? null, page.before?.id ?? null, page.limit],
  );
}

export async function readCaptured(em: EntityManager, id: string): Promise<CapturedMessage | null> {
  const found = await row<CapturedSummary & { messageId: string | null; source: string }>(
    em,
    `select id, subject, sender, recipients, at, message_id as "messageId", source from captured_mail where id = $1`,
    [id],
  );
  if (found === null) return null;
  const { source, ...summary } = found;
  const { text, html } = readMessage(source);
  return { ...summary, text, html };
}

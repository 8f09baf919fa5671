import { defineRoute, type Route } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { notFound } from '#server/http/problem.ts';
import { listCaptured, readCaptured } from '#server/mail/captured-mail.ts';
import type { Services } from '#server/container.ts';
import mailSchema from '#schemas/api/captured-mail.schema.json' with { type: 'json' };
import messageSchema from '#schemas/api/captured-message.schema.json' with { type: 'json' };
import type { CapturedMail, CapturedMessage } from '#shared/generated/api-types.ts';

const READ = { action: 'read', subject: 'Mail' } as const;

/** Where messages really leave, what an earlier capture kept is nobody's to read here. */
function ensureCapturing({ config }: Services): void {
  if (!config.captureMail) throw notFound();
}

export const mailCaptureRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery; reply: Page<CapturedMail> }>({
    method: 'get',
    path: '/api/mail',
    summary: 'Messages kept by the local capture, newest first; 404 where messages are sent',
    permission: READ,
    query: PAGE_QUERY,
    reply: pageSchema(mailSchema),
    handler: async ({ em, query, services }) => {
      ensureCapturing(services);
      const { limit, after } = parsePage(query, ['instant', 'uuid']);
      const before = after ? { at: String(after[0]), id: String(after[1]) } : undefined;
      const rows = await listCaptured(em, { limit: limit + 1, before });
      return toPage({
        rows,
        limit,
        key: (mail) => [mail.at, mail.id],
        item: (mail) => ({ ...mail, recipients: [...mail.recipients] }),
      });
    },
  }),
  defineRoute<{ reply: CapturedMessage }>({
    method: 'get',
    path: '/api/mail/:id',
    summary: 'One captured message as text and HTML',
    permission: READ,
    reply: messageSchema,
    handler: async ({ em, params, services }) => {
      ensureCapturing(services);
      const message = await readCaptured(em, params.id);
      if (!message) throw notFound();
      return { ...message, recipients: [...message.recipients] };
    },
  }),
];

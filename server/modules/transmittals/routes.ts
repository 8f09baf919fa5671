import { pipeline } from 'node:stream/promises';
import transmittalBody from '#schemas/api/transmittal-body.schema.json' with { type: 'json' };
import transmittalSchema from '#schemas/api/transmittal.schema.json' with { type: 'json' };
import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { pageSchema, PAGE_QUERY, parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { conflict, notFound } from '#server/http/problem.ts';
import type { Transmittal, TransmittalBody } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { requestTransmittal } from './request-transmittal.ts';
import { presentTransmittal, TRANSMITTAL_SELECT, type TransmittalDbRow } from './transmittal-select.ts';

const READ = { action: 'read', subject: 'Transmittal' } as const;
const canIssue = (ability: Ability): boolean => ability.can('issue', 'Transmittal');

async function readTransmittal(em: EntityManager, id: string): Promise<TransmittalDbRow> {
  const found = await row<TransmittalDbRow>(em, `${TRANSMITTAL_SELECT} where t.id = $1`, [id]);
  if (!found) throw notFound();
  return found;
}

export const transmittalRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery & { state?: string }; reply: Page<Transmittal> }>({
    method: 'get',
    path: '/api/transmittals',
    summary: 'Transmittals, newest first',
    permission: READ,
    query: { ...PAGE_QUERY, state: { type: 'string', enum: ['queued', 'running', 'issued', 'failed'] } },
    reply: pageSchema(transmittalSchema),
    handler: async ({ em, query, ability }) => {
      const { limit, after } = parsePage(query, ['instant', 'uuid']);
      const found = await rows<TransmittalDbRow>(
        em,
        `${TRANSMITTAL_SELECT} where ($1::text is null or t.state = $1)
           and ($2::timestamptz is null or (t.created_at, t.id) < ($2, $3::uuid))
         order by t.created_at desc, t.id desc limit $4`,
        [query.state ?? null, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
      );
      const issue = canIssue(ability);
      return toPage({
        rows: found,
        limit,
        key: (item) => [item.created_at, item.id],
        item: (item) => presentTransmittal(item, issue),
      });
    },
  }),
  defineRoute<{ reply: Transmittal }>({
    method: 'get',
    path: '/api/transmittals/:id',
    summary: 'One transmittal',
    permission: READ,
    reply: transmittalSchema,
    handler: async ({ em, params, ability }) =>
      presentTransmittal(await readTransmittal(em, params.id), canIssue(ability)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/transmittals/:id/file',
    summary: 'The as-built workbook, byte for byte as issued',
    permission: READ,
    raw: true,
    produces: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    handler: async ({ em, params, services, res }) => {
      const found = await readTransmittal(em, params.id);
      if (found.state !== 'issued' || !found.sha256)
        throw conflict('transmittal.not-issued', 'This transmittal has not been issued yet.');
      const file = await services.blobs.openRead(found.sha256);
      res
        .type('application/vnd.openxmlformats-officedocument.spreadsheetml.sheet')
        .attachment(found.file_name ?? `${found.number}.xlsx`)
        .set({ 'Content-Length': String(found.size), ETag: `"${found.sha256}"` });
      await pipeline(file, res);
    },
  }),
  defineRoute<{ body: TransmittalBody; reply: Transmittal }>({
    method: 'post',
    path: '/api/transmittals',
    summary: 'Issue an as-built workbook for a scope',
    permission: { action: 'issue', subject: 'Transmittal' },
    body: transmittalBody,
    reply: transmittalSchema,
    creates: true,
    status: 202,
    handler: async ({ em, body, actor, ability }) =>
      presentTransmittal(
        await readTransmittal(em, await requestTransmittal(em, { body, actor })),
        canIssue(ability),
      ),
  }),
];

import { defineRoute, type Route } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, type Page } from '#server/http/page.ts';
import createLotBodySchema from '#schemas/api/create-lot-body.schema.json' with { type: 'json' };
import lotDetailSchema from '#schemas/api/lot-detail.schema.json' with { type: 'json' };
import lotEventBodySchema from '#schemas/api/lot-event-body.schema.json' with { type: 'json' };
import lotSchema from '#schemas/api/lot.schema.json' with { type: 'json' };
import type { CreateLotBody, Lot, LotDetail, LotEventBody } from '#shared/generated/api-types.ts';
import { addLotEvent } from './add-lot-event.ts';
import { createLot } from './create-lot.ts';
import { listLots, readLot, type LotQuery } from './list-lots.ts';

export const lotRoutes: readonly Route[] = [
  defineRoute<{ query: LotQuery; reply: Page<Lot> }>({
    method: 'get',
    path: '/api/lots',
    summary: 'Lots with receipts, use and balance',
    permission: { action: 'read', subject: 'Lot' },
    query: {
      ...PAGE_QUERY,
      status: { type: 'array', maxItems: 3, items: { enum: ['in-use', 'held', 'recalled'] } },
      number: { type: 'string', minLength: 1, maxLength: 60 },
    },
    reply: pageSchema(lotSchema),
    handler: async (ctx) => listLots(ctx.em, { query: ctx.query, viewer: ctx }),
  }),
  defineRoute<{ reply: LotDetail }>({
    method: 'get',
    path: '/api/lots/:id',
    summary: 'One lot, what happened to it, and every structure it went into',
    permission: { action: 'read', subject: 'Lot' },
    reply: lotDetailSchema,
    handler: async ({ em, params, ability }) => readLot(em, { id: params.id, ability }),
  }),
  defineRoute<{ body: CreateLotBody; reply: LotDetail }>({
    method: 'post',
    path: '/api/lots',
    summary: 'Enter a lot',
    permission: { action: 'create', subject: 'Lot' },
    creates: true,
    body: createLotBodySchema,
    reply: lotDetailSchema,
    handler: async ({ em, body, actor, ability }) =>
      readLot(em, { id: await createLot(em, { body, actor }), ability }),
  }),
  defineRoute<{ body: LotEventBody; reply: LotDetail }>({
    method: 'post',
    path: '/api/lots/:id/events',
    summary: 'Receive kits of a lot; hold, release or recall it',
    permission: { action: 'update', subject: 'Lot' },
    creates: true,
    body: lotEventBodySchema,
    reply: lotDetailSchema,
    handler: async ({ em, params, body, actor, ability }) => {
      await addLotEvent(em, { lotId: params.id, body, actor });
      return readLot(em, { id: params.id, ability });
    },
  }),
];

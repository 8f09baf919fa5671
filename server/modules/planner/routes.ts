import { defineRoute, type Route } from '#server/http/define-route.ts';
import plannerLotSchema from '#schemas/api/planner-lot.schema.json' with { type: 'json' };
import type { PlannerLot } from '#shared/generated/api-types.ts';
import { listStock } from './list-stock.ts';

/** What a plan is computed from comes from the routes of work orders, products and the standard; stock by kit size from here. */
export const plannerRoutes: readonly Route[] = [
  defineRoute<{ query: { product?: string }; reply: { items: PlannerLot[] } }>({
    method: 'get',
    path: '/api/planner/stock',
    summary: 'Kits left, by lot and size',
    // Balances tell of every contractor’s use: whoever may see lots.
    permission: { action: 'read', subject: 'Lot' },
    query: { product: { type: 'string', minLength: 1, maxLength: 60 } },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: plannerLotSchema } },
      required: ['items'],
    },
    handler: async ({ em, query }) => listStock(em, query),
  }),
];

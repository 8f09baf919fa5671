import { defineRoute, type Route } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, type Page, type PageQuery } from '#server/http/page.ts';
import createWorkOrderBodySchema from '#schemas/api/create-work-order-body.schema.json' with { type: 'json' };
import plannedStructureSchema from '#schemas/api/planned-structure.schema.json' with { type: 'json' };
import workOrderSchema from '#schemas/api/work-order.schema.json' with { type: 'json' };
import type { CreateWorkOrderBody, PlannedStructure, WorkOrder } from '#shared/generated/api-types.ts';
import { createWorkOrder } from './create-work-order.ts';
import { listStructures } from './list-structures.ts';
import { listWorkOrders, readWorkOrder } from './list-work-orders.ts';
import { sendTemplate } from './send-template.ts';

export const workOrderRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery; reply: Page<WorkOrder> }>({
    method: 'get',
    path: '/api/work-orders',
    summary: 'Work orders, newest first',
    permission: { action: 'read', subject: 'WorkOrder' },
    query: PAGE_QUERY,
    reply: pageSchema(workOrderSchema),
    handler: async (ctx) => listWorkOrders(ctx.em, { query: ctx.query, viewer: ctx }),
  }),
  defineRoute<{ body: CreateWorkOrderBody; reply: WorkOrder }>({
    method: 'post',
    path: '/api/work-orders',
    summary: 'Let a work order with its design list to a contractor',
    permission: { action: 'create', subject: 'WorkOrder' },
    creates: true,
    body: createWorkOrderBodySchema,
    reply: workOrderSchema,
    handler: async ({ em, body, actor, ability }) =>
      readWorkOrder(em, { id: await createWorkOrder(em, { body, actor }), actor, ability }),
  }),
  defineRoute<{ reply: WorkOrder }>({
    method: 'get',
    path: '/api/work-orders/:id',
    summary: 'One work order',
    permission: { action: 'read', subject: 'WorkOrder' },
    reply: workOrderSchema,
    handler: async ({ em, params, actor, ability }) => readWorkOrder(em, { id: params.id, actor, ability }),
  }),
  defineRoute<{ reply: { items: PlannedStructure[] } }>({
    method: 'get',
    path: '/api/work-orders/:id/structures',
    summary: 'The design list, and where each structure stands',
    permission: { action: 'read', subject: 'WorkOrder' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: plannedStructureSchema } },
      required: ['items'],
    },
    handler: async ({ em, params, actor, ability }) => listStructures(em, { id: params.id, actor, ability }),
  }),
  defineRoute({
    method: 'get',
    path: '/api/work-orders/:id/template.xlsx',
    summary: 'The workbook template of a work order',
    permission: { action: 'read', subject: 'WorkOrder' },
    raw: true,
    produces: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    handler: async (ctx) => sendTemplate(ctx),
  }),
];

import { defineRoute, type Route } from '#server/http/define-route.ts';
import checkContextSchema from '#schemas/api/check-context.schema.json' with { type: 'json' };
import type { CheckContextData } from '#shared/generated/api-types.ts';
import { readCheckContext } from './read-check-context.ts';

export const checkContextRoutes: readonly Route[] = [
  defineRoute<{ reply: CheckContextData }>({
    method: 'get',
    path: '/api/work-orders/:id/check-context',
    summary: 'What a workbook for this work order can be checked against before it is handed in',
    permission: { action: 'read', subject: 'WorkOrder' },
    reply: checkContextSchema,
    handler: async ({ em, params, ability }) => readCheckContext(em, { id: params.id, ability }),
  }),
];

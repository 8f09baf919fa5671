import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { ActionDue } from '#shared/review/states.ts';

/** What is due after a rejection, or the condition of a concession, with its owner and day. */
export const OpenAction = defineEntity({
  name: 'OpenAction',
  tableName: 'actions',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    findingId: p.uuid().nullable(),
    concessionId: p.uuid().nullable(),
    type: p.text().$type<ActionDue | 'condition'>(),
    text: p.text().nullable(),
    ownerOrgId: p.uuid().nullable(),
    ownerId: p.uuid().nullable(),
    dueOn: p.date().nullable(),
    remindedAt: p.datetime(3).nullable(),
    closedAt: p.datetime(3).nullable(),
    closedBy: p.uuid().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type OpenAction = InferEntity<typeof OpenAction>;

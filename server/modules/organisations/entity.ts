import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const Organisation = defineEntity({
  name: 'Organisation',
  tableName: 'organisations',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    kind: p.text().$type<'owner' | 'contractor'>(),
    name: p.text(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Organisation = InferEntity<typeof Organisation>;

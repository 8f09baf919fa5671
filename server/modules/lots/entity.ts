import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const Lot = defineEntity({
  name: 'Lot',
  tableName: 'lots',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    productId: p.uuid(),
    number: p.text(),
    expiresOn: p.date().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Lot = InferEntity<typeof Lot>;

import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const FoamProduct = defineEntity({
  name: 'FoamProduct',
  tableName: 'products',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    code: p.text(),
    name: p.text(),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type FoamProduct = InferEntity<typeof FoamProduct>;

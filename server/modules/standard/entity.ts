import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const StandardVersion = defineEntity({
  name: 'StandardVersion',
  tableName: 'standard_versions',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    n: p.integer(),
    title: p.text().default(''),
    effectiveOn: p.date(),
    body: p.json<object>(),
    state: p.text().$type<'draft' | 'published'>().default('draft'),
    authorId: p.uuid().nullable(),
    approverId: p.uuid().nullable(),
    publishedAt: p.datetime(3).nullable(),
    note: p.text().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type StandardVersion = InferEntity<typeof StandardVersion>;

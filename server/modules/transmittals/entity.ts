import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const Transmittal = defineEntity({
  name: 'Transmittal',
  tableName: 'transmittals',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    number: p.text().defaultRaw(`human_number('T', nextval('transmittal_numbers'), 4)`),
    revision: p.integer().default(0),
    supersedesId: p.uuid().nullable(),
    scope: p.json<object>(),
    title: p.text().default(''),
    state: p.text().$type<'queued' | 'running' | 'issued' | 'failed'>().default('queued'),
    rows: p.integer().nullable(),
    sha256: p.text().nullable(),
    size: p.bigint('number').nullable(),
    fileName: p.text().nullable(),
    contentDigest: p.text().nullable(),
    problem: p.json<{ code: string; detail: string }>().nullable(),
    recipients: p.json<{ name: string; address: string }[]>().defaultRaw(`'[]'`),
    requestedBy: p.uuid().nullable(),
    createdAt: p.datetime(3).defaultRaw('now()'),
    issuedAt: p.datetime(3).nullable(),
    version: p.integer().version().default(1),
  },
});
export type Transmittal = InferEntity<typeof Transmittal>;

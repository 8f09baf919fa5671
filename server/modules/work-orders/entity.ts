import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

export const WorkOrder = defineEntity({
  name: 'WorkOrder',
  tableName: 'work_orders',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    number: p.text(),
    title: p.text(),
    contractorId: p.uuid(),
    /** IANA zone of the order's wall-clock times. */
    zone: p.text(),
    /** GeoJSON polygon. */
    area: p.json<object>().nullable(),
    state: p.text().$type<'open' | 'closed'>().default('open'),
    startsOn: p.date().nullable(),
    dueOn: p.date().nullable(),
    plannedTemperatureF: p.double().$type<number>().nullable(),
    batchPrefix: p.text(),
    batchCount: p.integer().default(0),
    version: p.integer().version().default(1),
    createdBy: p.uuid().nullable(),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type WorkOrder = InferEntity<typeof WorkOrder>;

export const Structure = defineEntity({
  name: 'Structure',
  tableName: 'structures',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    number: p.text(),
    retiredAt: p.datetime(3).nullable(),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Structure = InferEntity<typeof Structure>;

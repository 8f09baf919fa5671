import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { Kind } from '#shared/records/types.ts';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';

export const Batch = defineEntity({
  name: 'Batch',
  tableName: 'batches',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    number: p.text(),
    workOrderId: p.uuid(),
    contractorId: p.uuid(),
    createdBy: p.uuid().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Batch = InferEntity<typeof Batch>;

export const Revision = defineEntity({
  name: 'Revision',
  tableName: 'revisions',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    batchId: p.uuid(),
    n: p.integer(),
    status: p.text().$type<RevisionStatus>().default('draft'),
    dueOn: p.date().nullable(),
    remindedAt: p.datetime(3).nullable(),
    /** Number of the newest input; 0 before the first. */
    input: p.integer().default(0),
    /** The check run that counts; frozen on submission. */
    runId: p.uuid().nullable(),
    submittedAt: p.datetime(3).nullable(),
    submittedBy: p.uuid().nullable(),
    inspectorId: p.uuid().nullable(),
    takenAt: p.datetime(3).nullable(),
    workedAt: p.datetime(3).nullable(),
    decidedAt: p.datetime(3).nullable(),
    decidedBy: p.uuid().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Revision = InferEntity<typeof Revision>;

export const Line = defineEntity({
  name: 'Line',
  tableName: 'lines',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    batchId: p.uuid(),
    kind: p.text().$type<Kind>(),
    structureKey: p.text(),
    structureNumber: p.text(),
    occurrence: p.integer().default(1),
    state: p.text().$type<LineState>().default('undecided'),
    revisionId: p.uuid().nullable(),
    recordId: p.uuid().nullable(),
    version: p.integer().version().default(1),
    createdAt: p.datetime(3).defaultRaw('now()'),
  },
});
export type Line = InferEntity<typeof Line>;

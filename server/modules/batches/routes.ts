import { contractorWall } from '#server/http/contractor-wall.ts';
import { defineRoute, type Route, type RouteContext } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, type Page } from '#server/http/page.ts';
import batchChangesSchema from '#schemas/api/batch-changes.schema.json' with { type: 'json' };
import batchRevisionSchema from '#schemas/api/batch-revision.schema.json' with { type: 'json' };
import batchSchema from '#schemas/api/batch.schema.json' with { type: 'json' };
import checkProgressSchema from '#schemas/api/check-progress.schema.json' with { type: 'json' };
import inputRowSchema from '#schemas/api/input-row.schema.json' with { type: 'json' };
import uploadReplySchema from '#schemas/api/upload-reply.schema.json' with { type: 'json' };
import type {
  Batch,
  BatchChanges,
  BatchRevision,
  CheckProgress,
  InputRow,
  UploadReply,
} from '#shared/generated/api-types.ts';
import { REVISION_STATUSES } from '#shared/review/states.ts';
import type { BatchDbRow } from './batch-select.ts';
import { createBatch } from './create-batch.ts';
import { isOpen } from './is-open.ts';
import { listBatches, type BatchQuery } from './list-batches.ts';
import { listInputs } from './list-inputs.ts';
import { listRevisions } from './list-revisions.ts';
import { presentBatch } from './present-batch.ts';
import { readBatch } from './read-batch.ts';
import { readChanges } from './read-changes.ts';
import { readCheck } from './read-check.ts';
import { recheckBatch } from './recheck-batch.ts';
import { submitBatch } from './submit-batch.ts';
import { uploadPhotos } from './upload-photos.ts';
import { uploadWorkbook } from './upload-workbook.ts';
import { withdrawBatch } from './withdraw-batch.ts';

type Viewer = Pick<RouteContext, 'actor' | 'ability' | 'em'>;

/** The batch as this person may see it, from behind the wall. */
const seen = (ctx: Viewer, id: string): Promise<BatchDbRow> =>
  readBatch(ctx.em, { id, contractorId: contractorWall(ctx.ability, 'read', 'Batch') });
const shown = async (ctx: Viewer, id: string): Promise<Batch> => presentBatch(await seen(ctx, id), ctx);
/** A draft's files and changes are its contractor's; the owner's people see an empty list. */
const isHidden = (ctx: Viewer, batch: BatchDbRow): boolean =>
  ctx.actor.orgKind === 'owner' && isOpen(batch.status) && batch.n === 0;

export const batchRoutes: readonly Route[] = [
  defineRoute<{ query: BatchQuery; reply: Page<Batch> }>({
    method: 'get',
    path: '/api/batches',
    summary: 'Batches, newest first',
    permission: { action: 'read', subject: 'Batch' },
    query: {
      ...PAGE_QUERY,
      status: { type: 'array', maxItems: 10, items: { enum: REVISION_STATUSES } },
      workOrder: { type: 'string', format: 'uuid' },
      contractor: { type: 'string', format: 'uuid' },
    },
    reply: pageSchema(batchSchema),
    handler: async (ctx) =>
      listBatches(ctx.em, {
        query: ctx.query,
        contractorId: contractorWall(ctx.ability, 'read', 'Batch'),
        item: (row) => presentBatch(row, ctx),
      }),
  }),
  defineRoute<{ reply: Batch }>({
    method: 'post',
    path: '/api/work-orders/:id/batches',
    summary: 'Begin a batch of a work order',
    permission: { action: 'create', subject: 'Batch' },
    creates: true,
    reply: batchSchema,
    handler: async (ctx) => {
      const made = await createBatch(ctx.em, {
        workOrderId: ctx.params.id,
        contractorId: contractorWall(ctx.ability, 'create', 'Batch'),
        actor: ctx.actor,
      });
      return shown(ctx, made.id);
    },
  }),
  defineRoute<{ reply: Batch }>({
    method: 'get',
    path: '/api/batches/:id',
    summary: 'One batch with its newest revision',
    permission: { action: 'read', subject: 'Batch' },
    reply: batchSchema,
    handler: async (ctx) => shown(ctx, ctx.params.id),
  }),
  defineRoute<{ reply: UploadReply }>({
    method: 'put',
    path: '/api/batches/:id/workbook',
    summary: 'Hand in the workbook (multipart, field workbook); it is checked at once',
    permission: { action: 'hand-in', subject: 'Batch' },
    raw: true,
    keyed: true,
    status: 202,
    reply: uploadReplySchema,
    handler: async (ctx) => uploadWorkbook(ctx),
  }),
  defineRoute<{ reply: UploadReply }>({
    method: 'post',
    path: '/api/batches/:id/photos',
    summary: 'Hand in photographs (multipart, field photos, many)',
    permission: { action: 'hand-in', subject: 'Batch' },
    raw: true,
    keyed: true,
    status: 202,
    reply: uploadReplySchema,
    handler: async (ctx) => uploadPhotos(ctx),
  }),
  defineRoute<{ reply: CheckProgress }>({
    method: 'get',
    path: '/api/batches/:id/check',
    summary: 'How far the check of the newest upload is',
    permission: { action: 'read', subject: 'Batch' },
    reply: checkProgressSchema,
    handler: async (ctx) => {
      const batch = await seen(ctx, ctx.params.id);
      return readCheck(ctx.em, { id: batch.revision_id, hideProblem: isHidden(ctx, batch) });
    },
  }),
  defineRoute<{ reply: { items: InputRow[] } }>({
    method: 'get',
    path: '/api/batches/:id/inputs',
    summary: 'Every file handed in, newest first',
    permission: { action: 'read', subject: 'Batch' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: inputRowSchema } },
      required: ['items'],
    },
    handler: async (ctx) => {
      const batch = await seen(ctx, ctx.params.id);
      return isHidden(ctx, batch) ? { items: [] } : listInputs(ctx.em, batch.id);
    },
  }),
  defineRoute<{ reply: { items: BatchRevision[] } }>({
    method: 'get',
    path: '/api/batches/:id/revisions',
    summary: 'Its revisions, newest first',
    permission: { action: 'read', subject: 'Batch' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: batchRevisionSchema } },
      required: ['items'],
    },
    handler: async (ctx) =>
      listRevisions(ctx.em, { batch: await seen(ctx, ctx.params.id), actor: ctx.actor }),
  }),
  defineRoute<{ reply: BatchChanges }>({
    method: 'get',
    path: '/api/batches/:id/changes',
    summary: 'What the newest check changed against the one before',
    permission: { action: 'read', subject: 'Batch' },
    reply: batchChangesSchema,
    handler: async (ctx) => readChanges(ctx.em, { batch: await seen(ctx, ctx.params.id), actor: ctx.actor }),
  }),
  defineRoute<{ reply: Batch }>({
    method: 'post',
    path: '/api/batches/:id/recheck',
    summary: 'Check the same files again, on what is in force now',
    permission: { action: 'hand-in', subject: 'Batch' },
    status: 202,
    reply: batchSchema,
    handler: async (ctx) => {
      const contractorId = contractorWall(ctx.ability, 'hand-in', 'Batch');
      await recheckBatch(ctx.em, { batchId: ctx.params.id, contractorId, actor: ctx.actor });
      return shown(ctx, ctx.params.id);
    },
  }),
  defineRoute<{ query: { input?: number }; reply: Batch }>({
    method: 'post',
    path: '/api/batches/:id/submit',
    summary: 'Hand the batch in; it is frozen',
    permission: { action: 'hand-in', subject: 'Batch' },
    query: {
      input: {
        type: 'integer',
        minimum: 1,
        description: 'Number of the newest upload that was looked at: refused when there is a newer one.',
      },
    },
    status: 200,
    reply: batchSchema,
    handler: async (ctx) => {
      const contractorId = contractorWall(ctx.ability, 'hand-in', 'Batch');
      await submitBatch(ctx.em, {
        batchId: ctx.params.id,
        contractorId,
        actor: ctx.actor,
        seenInput: ctx.query.input ?? null,
      });
      return shown(ctx, ctx.params.id);
    },
  }),
  defineRoute<{ reply: Batch }>({
    method: 'post',
    path: '/api/batches/:id/withdraw',
    summary: 'Take a submitted batch back while no inspector has taken it',
    permission: { action: 'hand-in', subject: 'Batch' },
    status: 200,
    reply: batchSchema,
    handler: async (ctx) => {
      const contractorId = contractorWall(ctx.ability, 'hand-in', 'Batch');
      await withdrawBatch(ctx.em, { batchId: ctx.params.id, contractorId, actor: ctx.actor });
      return shown(ctx, ctx.params.id);
    },
  }),
];

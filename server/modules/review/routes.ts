import approveCleanReply from '#schemas/api/approve-clean-reply.schema.json' with { type: 'json' };
import assignBody from '#schemas/api/assign-body.schema.json' with { type: 'json' };
import batchSchema from '#schemas/api/batch.schema.json' with { type: 'json' };
import closeReviewReply from '#schemas/api/close-review-reply.schema.json' with { type: 'json' };
import findingDecisionBody from '#schemas/api/finding-decision-body.schema.json' with { type: 'json' };
import findingSchema from '#schemas/api/finding-row.schema.json' with { type: 'json' };
import reasonBody from '#schemas/api/reason-body.schema.json' with { type: 'json' };
import recordDecisionBody from '#schemas/api/record-decision-body.schema.json' with { type: 'json' };
import recordSchema from '#schemas/api/record-row.schema.json' with { type: 'json' };
import { defineRoute, type Route, type RouteContext } from '#server/http/define-route.ts';
import { presentBatch } from '#server/modules/batches/present-batch.ts';
import { readBatch } from '#server/modules/batches/read-batch.ts';
import { readFinding } from '#server/modules/records/read-finding.ts';
import { readRecord } from '#server/modules/records/read-record.ts';
import type {
  ApproveCleanReply,
  AssignBody,
  Batch,
  CloseReviewReply,
  FindingDecisionBody,
  FindingRow,
  ReasonBody,
  RecordDecisionBody,
  RecordRow,
} from '#shared/generated/api-types.ts';
import type { Action, SubjectName } from '#shared/permissions/ability.ts';
import { approveCleanLines } from './approve-clean-lines.ts';
import { closeReview } from './close-review.ts';
import { decideFinding, undoFindingDecision } from './decide-finding.ts';
import { decideRecord, undoRecordDecision } from './decide-record.ts';
import { moveBatch } from './move-batch.ts';
import { moveDecidedLine } from './move-decided-line.ts';

type Viewing = Pick<RouteContext, 'em' | 'actor' | 'ability' | 'params'>;
const batchOf = async ({ em, actor, ability, params }: Viewing): Promise<Batch> =>
  presentBatch(await readBatch(em, { id: params.id, contractorId: null }), { actor, ability });
const findingOf = ({ em, actor, ability, params }: Viewing): Promise<FindingRow> =>
  readFinding(em, { id: params.id, actor, ability });
const recordOf = ({ em, actor, ability, params }: Viewing): Promise<RecordRow> =>
  readRecord(em, { id: params.id, actor, ability });

const REVIEW_BATCH = { action: 'review', subject: 'Batch' } as const;
const REVIEW_FINDING = { action: 'review', subject: 'Finding' } as const;
const REVIEW_RECORD = { action: 'review', subject: 'Record' } as const;

const moveRoute = (type: 'take' | 'release', summary: string): Route =>
  defineRoute<{ reply: Batch }>({
    method: 'post',
    path: `/api/batches/:id/${type}`,
    summary,
    permission: REVIEW_BATCH,
    reply: batchSchema,
    handler: async (ctx) => {
      await moveBatch(ctx.em, { batchId: ctx.params.id, actor: ctx.actor, move: { type } });
      return batchOf(ctx);
    },
  });

const decidedLineRoute = (
  word: 'reopen' | 'refer-back' | 'abandon',
  summary: string,
  permission: { action: Action; subject: SubjectName },
): Route =>
  defineRoute<{ body: ReasonBody; reply: RecordRow }>({
    method: 'post',
    path: `/api/records/:id/${word}`,
    summary,
    permission,
    body: reasonBody,
    reply: recordSchema,
    handler: async (ctx) => {
      await moveDecidedLine(ctx.em, {
        recordId: ctx.params.id,
        word,
        reason: ctx.body.reason,
        actor: ctx.actor,
      });
      return recordOf(ctx);
    },
  });

export const reviewRoutes: readonly Route[] = [
  moveRoute('take', 'Take a submitted batch for review'),
  moveRoute('release', 'Give a taken batch back to the queue'),
  defineRoute<{ body: AssignBody; reply: Batch }>({
    method: 'post',
    path: '/api/batches/:id/assign',
    summary: 'Hand a review to another inspector',
    permission: { action: 'assign', subject: 'Batch' },
    body: assignBody,
    reply: batchSchema,
    handler: async (ctx) => {
      const { inspectorId, reason } = ctx.body;
      await moveBatch(ctx.em, {
        batchId: ctx.params.id,
        actor: ctx.actor,
        move: { type: 'assign', inspectorId },
        reason,
      });
      return batchOf(ctx);
    },
  }),
  defineRoute<{ reply: ApproveCleanReply }>({
    method: 'post',
    path: '/api/batches/:id/approve-clean',
    summary: 'Approve every undecided line without findings to decide',
    permission: REVIEW_BATCH,
    reply: approveCleanReply,
    handler: async ({ em, params, actor }) => ({
      approved: await approveCleanLines(em, { batchId: params.id, actor }),
    }),
  }),
  defineRoute<{ reply: CloseReviewReply }>({
    method: 'post',
    path: '/api/batches/:id/close-review',
    summary: 'Close the review',
    permission: REVIEW_BATCH,
    reply: closeReviewReply,
    handler: ({ em, params, actor }) => closeReview(em, { batchId: params.id, actor }),
  }),
  defineRoute<{ body: FindingDecisionBody; reply: FindingRow }>({
    method: 'put',
    path: '/api/findings/:id/decision',
    summary: 'Approve or reject a finding',
    permission: REVIEW_FINDING,
    body: findingDecisionBody,
    reply: findingSchema,
    ifMatch: true,
    handler: async (ctx) => {
      const { em, actor, ability, params, body, ifMatch } = ctx;
      await decideFinding(em, { findingId: params.id, version: ifMatch ?? 0, actor, ability, request: body });
      return findingOf(ctx);
    },
  }),
  defineRoute<{ reply: FindingRow }>({
    method: 'delete',
    path: '/api/findings/:id/decision',
    summary: 'Undo the decision on a finding while the review is open',
    permission: REVIEW_FINDING,
    reply: findingSchema,
    ifMatch: true,
    handler: async (ctx) => {
      const { em, actor, ability, params, ifMatch } = ctx;
      await undoFindingDecision(em, { findingId: params.id, version: ifMatch ?? 0, actor, ability });
      return findingOf(ctx);
    },
  }),
  defineRoute<{ body: RecordDecisionBody; reply: RecordRow }>({
    method: 'put',
    path: '/api/records/:id/decision',
    summary: 'Approve a line without findings, or return a line',
    permission: REVIEW_RECORD,
    body: recordDecisionBody,
    reply: recordSchema,
    ifMatch: true,
    handler: async (ctx) => {
      const { em, actor, ability, params, body, ifMatch } = ctx;
      await decideRecord(em, { recordId: params.id, version: ifMatch ?? 0, actor, ability, request: body });
      return recordOf(ctx);
    },
  }),
  defineRoute<{ reply: RecordRow }>({
    method: 'delete',
    path: '/api/records/:id/decision',
    summary: 'Undo the decision on a line while the review is open',
    permission: REVIEW_RECORD,
    reply: recordSchema,
    ifMatch: true,
    handler: async (ctx) => {
      const { em, actor, ability, params, ifMatch } = ctx;
      await undoRecordDecision(em, { recordId: params.id, version: ifMatch ?? 0, actor, ability });
      return recordOf(ctx);
    },
  }),
  decidedLineRoute('reopen', 'Reopen an approved line that is not on record', REVIEW_RECORD),
  decidedLineRoute('refer-back', 'Refer an approved line back instead of entering it', {
    action: 'enter',
    subject: 'RegisterEntry',
  }),
  decidedLineRoute('abandon', 'Give up a returned line that never came back', {
    action: 'assign',
    subject: 'Record',
  }),
];

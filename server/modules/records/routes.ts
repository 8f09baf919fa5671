import { contractorWall } from '#server/http/contractor-wall.ts';
import { defineRoute, type JsonSchema, type Route, type RouteContext } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, parsePage, type Page } from '#server/http/page.ts';
import answerBodySchema from '#schemas/api/answer-body.schema.json' with { type: 'json' };
import findingRowSchema from '#schemas/api/finding-row.schema.json' with { type: 'json' };
import recordRowSchema from '#schemas/api/record-row.schema.json' with { type: 'json' };
import recordSheetDataSchema from '#schemas/api/record-sheet-data.schema.json' with { type: 'json' };
import { SEVERITIES } from '#shared/findings/types.ts';
import type { AnswerBody, FindingRow, RecordRow, RecordSheetData } from '#shared/generated/api-types.ts';
import { KINDS } from '#shared/records/types.ts';
import { LINE_STATES } from '#shared/review/states.ts';
import { answerFinding } from './answer-finding.ts';
import { listFindings, type FindingQuery } from './list-findings.ts';
import { listRecords, type RecordQuery } from './list-records.ts';
import { readFinding } from './read-finding.ts';
import { readRecordSheet } from './read-record-sheet.ts';
import { shownRevision } from './shown-revision.ts';

const many = (items: JsonSchema, maxItems = 60): JsonSchema => ({ type: 'array', maxItems, items });
const CODE: JsonSchema = { type: 'string', pattern: '^[a-z][a-z0-9-]{0,59}$' };
const FILTERS = {
  ...PAGE_QUERY,
  code: many(CODE),
  severity: many({ enum: SEVERITIES }),
  structure: { type: 'string', minLength: 1, maxLength: 40 },
  revision: { type: 'integer', minimum: 0, maximum: 10_000 },
};
type OfRevision = { revision?: number };

const shown = (ctx: Pick<RouteContext, 'em' | 'actor' | 'ability'>, batchId: string, query: OfRevision) =>
  shownRevision(ctx.em, {
    batchId,
    contractorId: contractorWall(ctx.ability, 'read', 'Batch'),
    actor: ctx.actor,
    revision: query.revision,
  });
const EMPTY = { items: [], nextCursor: null, total: 0 };

export const recordRoutes: readonly Route[] = [
  defineRoute<{ query: RecordQuery & OfRevision; reply: Page<RecordRow> }>({
    method: 'get',
    path: '/api/batches/:id/records',
    summary: 'Lines of the newest checked revision, or of the one asked for',
    permission: { action: 'read', subject: 'Record' },
    query: { ...FILTERS, state: many({ enum: LINE_STATES }), kind: many({ enum: KINDS }) },
    reply: pageSchema(recordRowSchema),
    handler: async (ctx) => {
      parsePage(ctx.query, ['number']);
      const revision = await shown(ctx, ctx.params.id, ctx.query);
      return revision ? listRecords(ctx.em, { revision, query: ctx.query, viewer: ctx }) : EMPTY;
    },
  }),
  defineRoute<{ query: FindingQuery & OfRevision; reply: Page<FindingRow> }>({
    method: 'get',
    path: '/api/batches/:id/findings',
    summary: 'Findings of the newest checked revision, or of the one asked for',
    permission: { action: 'read', subject: 'Finding' },
    query: {
      ...FILTERS,
      state: many({ enum: ['undecided', 'approved', 'rejected', 'concession-asked'] }),
      recordId: { type: 'string', format: 'uuid' },
      withoutLine: { type: 'boolean' },
    },
    reply: pageSchema(findingRowSchema),
    handler: async (ctx) => {
      parsePage(ctx.query, ['number']);
      const revision = await shown(ctx, ctx.params.id, ctx.query);
      return revision ? listFindings(ctx.em, { revision, query: ctx.query, viewer: ctx }) : EMPTY;
    },
  }),
  defineRoute<{ reply: RecordSheetData }>({
    method: 'get',
    path: '/api/records/:id',
    summary: 'Everything on the record sheet of one line',
    permission: { action: 'read', subject: 'Record' },
    reply: recordSheetDataSchema,
    handler: async ({ em, params, actor, ability }) => readRecordSheet(em, { id: params.id, actor, ability }),
  }),
  defineRoute<{ body: AnswerBody; reply: FindingRow }>({
    method: 'put',
    path: '/api/findings/:id/answer',
    summary: 'Answer a finding in writing',
    permission: { action: 'hand-in', subject: 'Finding' },
    body: answerBodySchema,
    reply: findingRowSchema,
    handler: async ({ em, params, body, actor, ability }) => {
      await answerFinding(em, { findingId: params.id, text: body.text, actor, ability });
      return readFinding(em, { id: params.id, actor, ability });
    },
  }),
];

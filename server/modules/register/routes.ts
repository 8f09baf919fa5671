import candidateSchema from '#schemas/api/register-candidate.schema.json' with { type: 'json' };
import entriesBody from '#schemas/api/register-entries-body.schema.json' with { type: 'json' };
import entriesReply from '#schemas/api/register-entries-reply.schema.json' with { type: 'json' };
import registerSchema from '#schemas/api/register-row.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { pageSchema, PAGE_QUERY, type Page } from '#server/http/page.ts';
import type {
  RegisterCandidate,
  RegisterEntriesBody,
  RegisterEntriesReply,
  RegisterRow,
} from '#shared/generated/api-types.ts';
import { enterRecords } from './enter-records.ts';
import { exportRegister } from './export-register.ts';
import { listCandidates, type CandidateQuery } from './list-candidates.ts';
import { listRegister, REGISTER_SORTS, type RegisterQuery } from './list-register.ts';
import { readVersions } from './read-versions.ts';
import { REGISTER_FILTER_QUERY, type RegisterFilter } from './register-filter.ts';

const READ = { action: 'read', subject: 'RegisterEntry' } as const;

export const registerRoutes: readonly Route[] = [
  defineRoute<{ query: RegisterQuery; reply: Page<RegisterRow> }>({
    method: 'get',
    path: '/api/register',
    summary: 'The as-built register',
    permission: READ,
    query: {
      ...PAGE_QUERY,
      ...REGISTER_FILTER_QUERY,
      sort: { type: 'string', enum: [...REGISTER_SORTS] },
    },
    reply: pageSchema(registerSchema),
    handler: ({ em, query, ability }) => listRegister(em, { query, ability }),
  }),
  defineRoute<{ query: CandidateQuery; reply: Page<RegisterCandidate> }>({
    method: 'get',
    path: '/api/register/candidates',
    summary: 'Approved lines that are not on record yet',
    permission: { action: 'enter', subject: 'RegisterEntry' },
    query: {
      ...PAGE_QUERY,
      workOrder: { type: 'string', format: 'uuid' },
      contractor: { type: 'string', format: 'uuid' },
    },
    reply: pageSchema(candidateSchema),
    handler: ({ em, query }) => listCandidates(em, query),
  }),
  defineRoute<{ query: RegisterFilter }>({
    method: 'get',
    path: '/api/register/export.csv',
    summary: 'The filtered register as CSV',
    permission: { action: 'export', subject: 'RegisterEntry' },
    query: REGISTER_FILTER_QUERY,
    raw: true,
    produces: 'text/csv',
    handler: exportRegister,
  }),
  defineRoute<{ body: RegisterEntriesBody; reply: RegisterEntriesReply }>({
    method: 'post',
    path: '/api/register/entries',
    summary: 'Enter approved lines on the register',
    permission: { action: 'enter', subject: 'RegisterEntry' },
    body: entriesBody,
    reply: entriesReply,
    creates: true,
    handler: ({ em, body, actor }) =>
      enterRecords(em, { recordIds: body.recordIds, reason: body.reason ?? null, actor }),
  }),
  defineRoute<{ params: { recordNumber: string }; reply: { items: RegisterRow[] } }>({
    method: 'get',
    path: '/api/register/:recordNumber',
    summary: 'Every version of one record number',
    permission: READ,
    params: { recordNumber: { type: 'string', maxLength: 40 } },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: registerSchema } },
      required: ['items'],
    },
    handler: async ({ em, params, ability }) => ({
      items: await readVersions(em, { recordNumber: params.recordNumber, ability }),
    }),
  }),
];

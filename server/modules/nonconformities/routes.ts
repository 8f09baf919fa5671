import nonconformitySchema from '#schemas/api/nonconformity.schema.json' with { type: 'json' };
import summarySchema from '#schemas/api/nonconformity-summary.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { pageSchema, PAGE_QUERY, type Page, type PageQuery } from '#server/http/page.ts';
import type { Nonconformity, NonconformitySummary } from '#shared/generated/api-types.ts';
import { exportNonconformities } from './export-nonconformities.ts';
import { listNonconformities } from './list-nonconformities.ts';
import { NONCONFORMITY_FILTER_QUERY, type NonconformityFilter } from './nonconformity-filter.ts';
import { summarise } from './summarise.ts';

export const nonconformityRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery & NonconformityFilter; reply: Page<Nonconformity> }>({
    method: 'get',
    path: '/api/nonconformities',
    summary: 'Findings of submitted lines that do not conform',
    permission: { action: 'read', subject: 'Nonconformity' },
    query: { ...PAGE_QUERY, ...NONCONFORMITY_FILTER_QUERY },
    reply: pageSchema(nonconformitySchema),
    handler: ({ em, query }) => listNonconformities(em, query),
  }),
  defineRoute<{ query: NonconformityFilter; reply: NonconformitySummary }>({
    method: 'get',
    path: '/api/nonconformities/summary',
    summary: 'Totals over the filter: by rule, by contractor, open actions by age',
    permission: { action: 'read', subject: 'Nonconformity' },
    query: NONCONFORMITY_FILTER_QUERY,
    reply: summarySchema,
    handler: ({ em, query }) => summarise(em, query),
  }),
  defineRoute<{ query: NonconformityFilter }>({
    method: 'get',
    path: '/api/nonconformities/export.csv',
    summary: 'The filtered nonconformities as CSV',
    permission: { action: 'export', subject: 'Nonconformity' },
    query: NONCONFORMITY_FILTER_QUERY,
    raw: true,
    produces: 'text/csv',
    handler: exportNonconformities,
  }),
];

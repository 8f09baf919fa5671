import concessionDecisionBody from '#schemas/api/concession-decision-body.schema.json' with { type: 'json' };
import concessionSchema from '#schemas/api/concession.schema.json' with { type: 'json' };
import reasonBody from '#schemas/api/reason-body.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { matchVersion } from '#server/http/match-version.ts';
import { pageSchema, PAGE_QUERY, type Page, type PageQuery } from '#server/http/page.ts';
import type { Concession, ConcessionDecisionBody, ReasonBody } from '#shared/generated/api-types.ts';
import { askConcession } from './ask-concession.ts';
import { decideConcession } from './decide-concession.ts';
import { listConcessions } from './list-concessions.ts';
import { readConcession } from './read-concession.ts';

export const concessionRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery & { state?: string }; reply: Page<Concession> }>({
    method: 'get',
    path: '/api/concessions',
    summary: 'Concessions, newest first',
    permission: { action: 'read', subject: 'Concession' },
    query: { ...PAGE_QUERY, state: { type: 'string', enum: ['asked', 'granted', 'refused', 'withdrawn'] } },
    reply: pageSchema(concessionSchema),
    handler: ({ em, query, actor, ability }) => listConcessions(em, { query, actor, ability }),
  }),
  defineRoute<{ reply: Concession }>({
    method: 'get',
    path: '/api/concessions/:id',
    summary: 'One concession',
    permission: { action: 'read', subject: 'Concession' },
    reply: concessionSchema,
    handler: ({ em, params, actor, ability }) => readConcession(em, { id: params.id, actor, ability }),
  }),
  defineRoute<{ body: ReasonBody; reply: Concession }>({
    method: 'post',
    path: '/api/findings/:id/concession',
    summary: 'Ask the engineers to accept a finding as built',
    permission: { action: 'review', subject: 'Concession' },
    body: reasonBody,
    reply: concessionSchema,
    creates: true,
    handler: async ({ em, params, body, actor, ability, req }) => {
      const version = req.get('if-match') === undefined ? null : matchVersion(req);
      const id = await askConcession(em, {
        findingId: params.id,
        reason: body.reason,
        version,
        actor,
        ability,
      });
      return readConcession(em, { id, actor, ability });
    },
  }),
  defineRoute<{ body: ConcessionDecisionBody; reply: Concession }>({
    method: 'put',
    path: '/api/concessions/:id/decision',
    summary: 'Grant or refuse a concession',
    permission: { action: 'concede', subject: 'Concession' },
    body: concessionDecisionBody,
    reply: concessionSchema,
    ifMatch: true,
    handler: async ({ em, params, body, actor, ability, ifMatch }) => {
      await decideConcession(em, {
        concessionId: params.id,
        version: ifMatch ?? 0,
        answer: body,
        actor,
        ability,
      });
      return readConcession(em, { id: params.id, actor, ability });
    },
  }),
];

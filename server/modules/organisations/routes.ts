import { defineRoute, type Route } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, type Page, type PageQuery } from '#server/http/page.ts';
import { addOrganisation, listOrganisations } from '#server/modules/organisations/organisations.ts';
import organisationSchema from '#schemas/api/organisation.schema.json' with { type: 'json' };
import organisationNewSchema from '#schemas/api/organisation-new.schema.json' with { type: 'json' };
import type { Organisation, OrganisationNew } from '#shared/generated/api-types.ts';

export const organisationRoutes: readonly Route[] = [
  defineRoute<{ query: PageQuery; reply: Page<Organisation> }>({
    method: 'get',
    path: '/api/organisations',
    summary: 'The owner and its contractors',
    permission: { action: 'read', subject: 'Organisation' },
    query: PAGE_QUERY,
    reply: pageSchema(organisationSchema),
    handler: ({ em, query }) => listOrganisations(em, query),
  }),
  defineRoute<{ body: OrganisationNew; reply: Organisation }>({
    method: 'post',
    path: '/api/organisations',
    summary: 'Add a contractor',
    permission: { action: 'create', subject: 'Organisation' },
    body: organisationNewSchema,
    reply: organisationSchema,
    creates: true,
    handler: ({ em, actor, body }) => addOrganisation(em, { actor, name: body.name }),
  }),
];

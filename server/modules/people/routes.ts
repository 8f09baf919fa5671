import { defineRoute, type Route } from '#server/http/define-route.ts';
import { PAGE_QUERY, pageSchema, type Page } from '#server/http/page.ts';
import { changePerson } from '#server/modules/people/change-person.ts';
import { inviteAgain } from '#server/modules/people/invite-again.ts';
import { invitePerson } from '#server/modules/people/invite-person.ts';
import { passwordRoutes } from '#server/modules/people/password-routes.ts';
import { listPeople, readPerson, type PeopleQuery } from '#server/modules/people/read-people.ts';
import personSchema from '#schemas/api/person.schema.json' with { type: 'json' };
import personChangeSchema from '#schemas/api/person-change.schema.json' with { type: 'json' };
import personNewSchema from '#schemas/api/person-new.schema.json' with { type: 'json' };
import type { Person, PersonChange, PersonNew } from '#shared/generated/api-types.ts';
import { ROLES } from '#shared/permissions/ability.ts';

export const peopleRoutes: readonly Route[] = [
  defineRoute<{ query: PeopleQuery; reply: Page<Person> }>({
    method: 'get',
    path: '/api/people',
    summary: 'People who may sign in, by name',
    permission: { action: 'read', subject: 'Person' },
    query: {
      ...PAGE_QUERY,
      q: { type: 'string', maxLength: 200, description: 'Part of a name or address.' },
      role: { type: 'string', enum: [...ROLES] },
      organisation: { type: 'string', format: 'uuid' },
      active: { type: 'boolean' },
    },
    reply: pageSchema(personSchema),
    handler: ({ em, query, ability }) => listPeople(em, query, ability),
  }),
  defineRoute<{ params: { id: string }; reply: Person }>({
    method: 'get',
    path: '/api/people/:id',
    summary: 'One person',
    permission: { action: 'read', subject: 'Person' },
    reply: personSchema,
    handler: ({ em, params, ability }) => readPerson(em, params.id, ability),
  }),
  defineRoute<{ body: PersonNew; reply: Person }>({
    method: 'post',
    path: '/api/people',
    summary: 'Invite a person: makes the account and sends a link to choose a password',
    permission: { action: 'create', subject: 'Person' },
    body: personNewSchema,
    reply: personSchema,
    creates: true,
    handler: async ({ em, actor, ability, body, services }) => {
      const id = await invitePerson(em, { actor, config: services.config, input: body });
      return readPerson(em, id, ability);
    },
  }),
  defineRoute<{ params: { id: string }; body: PersonChange; reply: Person }>({
    method: 'patch',
    path: '/api/people/:id',
    summary: 'Change a name, a role, or whether the account is open',
    permission: { action: 'update', subject: 'Person' },
    body: personChangeSchema,
    reply: personSchema,
    ifMatch: true,
    handler: async ({ em, actor, ability, params, body, ifMatch }) => {
      await changePerson(em, { actor, ability, id: params.id, version: ifMatch ?? 0, input: body });
      return readPerson(em, params.id, ability);
    },
  }),
  defineRoute<{ params: { id: string } }>({
    method: 'post',
    path: '/api/people/:id/invitation',
    summary: 'Send the invitation again',
    permission: { action: 'update', subject: 'Person' },
    handler: ({ em, actor, ability, params, services }) =>
      inviteAgain(em, { actor, ability, config: services.config, id: params.id }),
  }),
  ...passwordRoutes,
];

import draftBody from '#schemas/api/standard-draft-body.schema.json' with { type: 'json' };
import standardSchema from '#schemas/api/standard-version.schema.json' with { type: 'json' };
import { rows } from '#server/db/rows.ts';
import { defineRoute, type Route } from '#server/http/define-route.ts';
import type { StandardDraftBody, StandardVersion } from '#shared/generated/api-types.ts';
import { draftStandard } from './draft-standard.ts';
import { publishStandard } from './publish-standard.ts';
import { presentStandard, readStandard, STANDARD_SELECT, type StandardDbRow } from './standard-select.ts';

const NUMBER = { n: { type: 'integer', minimum: 1, maximum: 100_000 } };

export const standardRoutes: readonly Route[] = [
  defineRoute<{ reply: { items: StandardVersion[] } }>({
    method: 'get',
    path: '/api/standard/versions',
    summary: 'Versions of the construction standard, newest first',
    permission: { action: 'read', subject: 'Standard' },
    reply: {
      type: 'object',
      properties: { items: { type: 'array', items: standardSchema } },
      required: ['items'],
    },
    handler: async ({ em, actor }) => ({
      items: (
        await rows<StandardDbRow>(
          em,
          `${STANDARD_SELECT} where s.state = 'published' or $1::boolean order by s.n desc`,
          [actor.orgKind === 'owner'],
        )
      ).map((item) => presentStandard(item, actor)),
    }),
  }),
  defineRoute<{ params: { n: number }; reply: StandardVersion }>({
    method: 'get',
    path: '/api/standard/versions/:n',
    summary: 'One version of the construction standard',
    permission: { action: 'read', subject: 'Standard' },
    params: NUMBER,
    reply: standardSchema,
    handler: ({ em, params, actor }) => readStandard(em, params.n, actor),
  }),
  defineRoute<{ body: StandardDraftBody; reply: StandardVersion }>({
    method: 'post',
    path: '/api/standard/versions',
    summary: 'Draft the next version of the standard',
    permission: { action: 'create', subject: 'Standard' },
    body: draftBody,
    reply: standardSchema,
    creates: true,
    handler: async ({ em, body, actor }) =>
      readStandard(em, await draftStandard(em, { draft: body, actor }), actor),
  }),
  defineRoute<{ params: { n: number }; reply: StandardVersion }>({
    method: 'post',
    path: '/api/standard/versions/:n/publish',
    summary: 'Put a draft into force, by a second engineer',
    permission: { action: 'publish', subject: 'Standard' },
    params: NUMBER,
    reply: standardSchema,
    ifMatch: true,
    handler: async ({ em, params, actor, ifMatch }) => {
      await publishStandard(em, { n: params.n, version: ifMatch ?? 0, actor });
      return readStandard(em, params.n, actor);
    },
  }),
];

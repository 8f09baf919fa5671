import { defineRoute, type JsonSchema, type Route } from '#server/http/define-route.ts';
import { buildOpenapi } from '#server/modules/openapi/build-openapi.ts';

/** Takes the table as a function, since this route stands in it. */
export function openapiRoutes(table: () => readonly Route[]): readonly Route[] {
  let document: JsonSchema | null = null;
  return [
    defineRoute<{ reply: JsonSchema }>({
      method: 'get',
      path: '/api/openapi.json',
      summary: 'This document',
      permission: 'public',
      handler: async () => (document ??= buildOpenapi(table())),
    }),
  ];
}

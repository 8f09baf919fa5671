import type { JsonSchema, Route } from '#server/http/define-route.ts';
import { paramSchemas } from '#server/http/request-context.ts';
import { readApiSchemas } from '#server/http/schema-validator.ts';

const PROBLEM: JsonSchema = {
  type: 'object',
  properties: {
    type: { type: 'string' },
    title: { type: 'string' },
    status: { type: 'integer' },
    code: { type: 'string', description: 'Stable name of the problem, for programs.' },
    detail: { type: 'string', description: 'What happened, what it means and what to do, for people.' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        properties: { pointer: { type: 'string' }, code: { type: 'string' }, detail: { type: 'string' } },
        required: ['pointer', 'code', 'detail'],
      },
    },
  },
  required: ['type', 'title', 'status', 'code', 'detail', 'errors'],
};

/** OpenAPI 3.1 from the route table; its schemas are JSON Schema 2020-12 as they stand. */
export function buildOpenapi(routes: readonly Route[]): JsonSchema {
  const schemas = readApiSchemas();
  const names = new Map([...schemas].map(([file, schema]) => [file, String(schema.title)]));
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const path = route.path.replaceAll(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(route, names) };
  }
  return {
    openapi: '3.1.0',
    jsonSchemaDialect: 'https://json-schema.org/draft/2020-12/schema',
    info: { title: 'Upstand', version: '1', description: 'Proof of how each pole was set in foam.' },
    paths,
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'upstand' } },
      schemas: {
        Problem: PROBLEM,
        ...Object.fromEntries(
          [...schemas].map(([file, schema]) => [names.get(file), rewrite(schema, names)]),
        ),
      },
    },
  };
}

function operation(route: Route, names: ReadonlyMap<string, string>): JsonSchema {
  const { permission } = route;
  const isWrite = route.method !== 'get' && permission !== 'public';
  const parameters = [
    ...Object.entries(paramSchemas(route)).map(([name, schema]) => ({
      name,
      in: 'path',
      required: true,
      schema,
    })),
    ...Object.entries(route.query ?? {}).map(([name, schema]) => ({ name, in: 'query', schema })),
    ...(isWrite ? [header('X-CSRF-Token', true)] : []),
    ...(route.creates || route.keyed ? [header('Idempotency-Key', false)] : []),
    ...(route.ifMatch ? [header('If-Match', true)] : []),
  ];
  const status = String(
    route.status ?? (route.creates ? 201 : route.reply || route.raw || !isWrite ? 200 : 204),
  );
  const produces = route.produces ?? 'application/json';
  return {
    operationId: `${route.method}${route.path.replaceAll(/[^A-Za-z0-9]+(\w)/g, (_, letter: string) => letter.toUpperCase())}`,
    summary: route.summary,
    'x-permission': permission,
    security: permission === 'public' ? [] : [{ session: [] }],
    parameters,
    ...(route.body
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: use(route.body, names) } },
          },
        }
      : {}),
    responses: {
      [status]: {
        description: 'Done',
        ...(status === '204'
          ? {}
          : { content: { [produces]: { schema: route.reply ? use(route.reply, names) : {} } } }),
      },
      default: {
        description: 'Refused; `code` says why',
        content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    },
  };
}

function header(name: string, required: boolean) {
  return { name, in: 'header', required, schema: { type: 'string' } };
}

/** A schema that stands in `schemas/api` is referred to by its title. */
function use(schema: JsonSchema, names: ReadonlyMap<string, string>): unknown {
  const named = [...names.values()].find((title) => title === schema.title);
  return named ? { $ref: `#/components/schemas/${named}` } : rewrite(schema, names);
}

function rewrite(value: unknown, names: ReadonlyMap<string, string>): unknown {
  if (Array.isArray(value)) return value.map((part) => rewrite(part, names));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).flatMap(([key, part]: [string, unknown]) => {
      if (key === '$schema' && typeof part === 'string') return [];
      if (key === '$ref' && typeof part === 'string') {
        const title = names.get(part.replace(/^\.\//, ''));
        return [[key, title ? `#/components/schemas/${title}` : part]];
      }
      return [[key, rewrite(part, names)]];
    }),
  );
}

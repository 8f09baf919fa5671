import type { EntityManager } from '@mikro-orm/postgresql';
import type { Request, Response } from 'express';
import type { Services } from '#server/container.ts';
import type { Ability, Action, Actor, SubjectName } from '#shared/permissions/ability.ts';

export type JsonSchema = { readonly [keyword: string]: unknown };
export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';
/** There is no default: a route that anyone may call says `public`. */
export type Permission = 'public' | 'signed-in' | { readonly action: Action; readonly subject: SubjectName };

/** The types of one route; what is left out is an empty object (params, query) or undefined (body, reply). */
export type RouteTypes = { params?: object; query?: object; body?: unknown; reply?: unknown };
type Part<T, Key extends string, Fallback> = T extends Record<Key, infer Value> ? Value : Fallback;

export type RouteContext<T extends RouteTypes = RouteTypes> = {
  readonly params: Part<T, 'params', { id: string }>;
  readonly query: Part<T, 'query', Record<string, never>>;
  readonly body: Part<T, 'body', undefined>;
  /** Who asks; throws 401 on a public route that nobody is signed in to. */
  readonly actor: Actor;
  readonly visitor: Actor | null;
  readonly ability: Ability;
  /** Fresh for this request; on a route that `creates`, with an Idempotency-Key, already inside a transaction. */
  readonly em: EntityManager;
  readonly services: Services;
  readonly req: Request;
  readonly res: Response;
  /** The version the caller last saw; never null on a route with `ifMatch`. */
  readonly ifMatch: number | null;
};

type RouteBase = {
  readonly method: Method;
  /** Express path, e.g. `/api/batches/:id`. A parameter without a schema in `params` is a UUID. */
  readonly path: string;
  readonly summary: string;
  readonly permission: Permission;
  /** Schemas of single parameters: `{ token: { type: 'string' } }`. */
  readonly params?: Readonly<Record<string, JsonSchema>>;
  /** Schemas of single query parameters; any other parameter is refused by name. */
  readonly query?: Readonly<Record<string, JsonSchema>>;
  readonly body?: JsonSchema;
  readonly reply?: JsonSchema;
  /** Default 200; 201 when `creates`; 204 when there is no reply. */
  readonly status?: number;
  /** Honours Idempotency-Key: the first answer is given again. */
  readonly creates?: boolean;
  /** A raw route whose handler honours Idempotency-Key itself: a file must not be read inside the key's transaction. */
  readonly keyed?: boolean;
  /** Requires If-Match: missing 428; the handler compares and throws `stale(current)`. */
  readonly ifMatch?: boolean;
  /** The handler reads the request or writes the answer itself (multipart, files, streams). */
  readonly raw?: boolean;
  /** Media type of a raw answer, for the OpenAPI document. */
  readonly produces?: string;
};

export type Route = RouteBase & { readonly handler: (ctx: RouteContext) => Promise<unknown> };
export type RouteOf<T extends RouteTypes> = RouteBase & {
  readonly handler: (ctx: RouteContext<T>) => Promise<Part<T, 'reply', void>>;
};

/** Checks what a route must not combine and forgets its types, so that all routes stand in one table. */
export function defineRoute<T extends RouteTypes = RouteTypes>(route: RouteOf<T>): Route {
  const name = `${route.method.toUpperCase()} ${route.path}`;
  if (route.creates && route.raw) {
    throw new Error(
      `${name}: a raw route cannot honour Idempotency-Key, since its answer is not kept; one that keeps it says \`keyed\`.`,
    );
  }
  if (route.keyed && !route.raw) throw new Error(`${name}: only a raw route keeps its answer itself.`);
  if (route.body && route.raw) throw new Error(`${name}: a raw route reads its body itself.`);
  if (route.creates && route.method !== 'post') throw new Error(`${name}: only a post creates.`);
  // The context given to the handler was checked against the route's own schemas, which is what T says.
  return route as unknown as Route;
}

import { createMongoAbility } from '@casl/ability';
import type { Request, Response } from 'express';
import type { Services } from '#server/container.ts';
import type { Route, RouteContext } from '#server/http/define-route.ts';
import { requireCsrfToken } from '#server/http/csrf.ts';
import { matchVersion } from '#server/http/match-version.ts';
import { forbidden, notFound, notSignedIn, problem, type ProblemError } from '#server/http/problem.ts';
import { readJsonBody } from '#server/http/read-json-body.ts';
import type { Validator } from '#server/http/schema-validator.ts';
import { defineAbilityFor, type Ability, type Actor } from '#shared/permissions/ability.ts';

export type RouteChecks = {
  params: (value: object) => ProblemError[];
  query: (value: object) => ProblemError[];
  body: ((value: unknown, bytes: number) => ProblemError[]) | null;
};

const NOBODY: Ability = createMongoAbility<Ability>([]);
const UUID = { type: 'string', format: 'uuid' };

/** Compiled when the route is first called: compiling all at start would cost a second of every test. */
export function createRouteChecks(route: Route, validator: Validator): () => RouteChecks {
  let checks: RouteChecks | null = null;
  return () => {
    checks ??= {
      params: validator.parameters({ type: 'object', properties: paramSchemas(route) }),
      query: validator.parameters({
        type: 'object',
        properties: route.query ?? {},
        additionalProperties: false,
      }),
      body: route.body ? validator.body(route.body) : null,
    };
    return checks;
  };
}

export function paramSchemas(route: Route): Record<string, object> {
  const names = [...route.path.matchAll(/:(\w+)/g)].map((match) => match[1] as string);
  return Object.fromEntries(names.map((name) => [name, route.params?.[name] ?? UUID]));
}

export function abilityOf(visitor: Actor | null): Ability {
  return visitor ? defineAbilityFor(visitor) : NOBODY;
}

/**
 * Who asks, whether they may, and only then what they ask: nothing of a refused request is parsed.
 * @throws Problem 401, 403, 404, 428, 400, 413, 415
 */
export async function admit(options: {
  route: Route;
  checks: RouteChecks;
  services: Services;
  req: Request;
  res: Response;
}): Promise<{ ctx: RouteContext; ability: Ability }> {
  const { route, checks, services, req, res } = options;
  const visitor = req.user ?? null;
  const ability = abilityOf(visitor);
  if (route.permission !== 'public') {
    if (!visitor) throw notSignedIn();
    if (route.method !== 'get') requireCsrfToken(req);
    if (route.permission !== 'signed-in' && !ability.can(route.permission.action, route.permission.subject)) {
      throw forbidden();
    }
  }
  const params: object = { ...req.params };
  // An address with an impossible id is an address of nothing.
  if (checks.params(params).length > 0) throw notFound();
  const query: object = { ...req.query };
  refuse(checks.query(query), 400, 'The address has a parameter that cannot be used.');
  const ifMatch = route.ifMatch ? matchVersion(req) : null;
  const body = checks.body ? await readBody(checks.body, req, res) : undefined;

  const ctx = {
    params,
    query,
    body,
    visitor,
    get actor(): Actor {
      if (!visitor) throw notSignedIn();
      return visitor;
    },
    ability,
    em: services.orm.em.fork(),
    services,
    req,
    res,
    ifMatch,
  };
  // The parts were checked against the route's schemas; their types are the route's own.
  return { ctx: ctx as unknown as RouteContext, ability };
}

async function readBody(
  check: NonNullable<RouteChecks['body']>,
  req: Request,
  res: Response,
): Promise<unknown> {
  const { body, bytes } = await readJsonBody(req, res);
  refuse(check(body, bytes), 400, 'The request is not as it should be.');
  return body;
}

function refuse(errors: readonly ProblemError[], status: number, what: string): void {
  const [first] = errors;
  if (!first) return;
  const place = first.pointer.replace(/^#\/query\//, '').replace(/^\//, '');
  throw problem(status, 'request.invalid', `${what} ${place ? `${place}: ` : ''}${first.detail}`, { errors });
}

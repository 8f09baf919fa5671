import type { Express, Request, Response } from 'express';
import type { Services } from '#server/container.ts';
import type { Route, RouteContext } from '#server/http/define-route.ts';
import { answerOnce, hashRequest, readIdempotencyKey, type KeptAnswer } from '#server/http/idempotency.ts';
import { Problem, problem } from '#server/http/problem.ts';
import { recordRefusal } from '#server/http/record-refusal.ts';
import { createReplyCheck, type ReplyCheck } from '#server/http/reply-check.ts';
import { admit, createRouteChecks } from '#server/http/request-context.ts';
import { createValidator, readApiSchemas } from '#server/http/schema-validator.ts';

/** Puts the route table on the app; a path that is in the table under another method answers 405. */
export function mountRoutes(app: Express, routes: readonly Route[], services: Services): void {
  const validator = createValidator(readApiSchemas());
  for (const route of routes) {
    const checksOf = createRouteChecks(route, validator);
    const checkReply = services.config.checkReplies ? createReplyCheck(route, validator) : null;
    app[route.method](route.path, async (req, res) => {
      try {
        const { ctx } = await admit({ route, checks: checksOf(), services, req, res });
        await answer({ route, ctx, checkReply });
      } catch (error) {
        if (error instanceof Problem && error.status === 403) {
          await recordRefusal(services, {
            req,
            actor: req.user ?? null,
            action: `${route.method.toUpperCase()} ${route.path}`,
            code: error.code,
            subject: Object.values(req.params).join(' ') || null,
          });
        }
        throw error;
      }
    });
  }
  for (const [path, methods] of methodsByPath(routes)) {
    const allow = methods.flatMap((method) => (method === 'GET' ? ['GET', 'HEAD'] : [method])).join(', ');
    app.all(path, (req: Request) => {
      throw problem(405, 'method.unknown', `${req.method} is not possible here.`, {
        headers: { Allow: allow },
      });
    });
  }
}

function methodsByPath(routes: readonly Route[]): Map<string, string[]> {
  const paths = new Map<string, string[]>();
  for (const route of routes) {
    paths.set(route.path, [...(paths.get(route.path) ?? []), route.method.toUpperCase()]);
  }
  return paths;
}

async function answer(options: {
  route: Route;
  ctx: RouteContext;
  checkReply: ReplyCheck | null;
}): Promise<void> {
  const { route, ctx, checkReply } = options;
  const key = route.creates ? readIdempotencyKey(ctx.req) : null;
  const first = async (context: RouteContext): Promise<KeptAnswer> => {
    const body = await route.handler(context);
    if (!context.res.headersSent) checkReply?.(body);
    return toAnswer(route, context.res, body);
  };
  if (key === null) {
    const made = await first(ctx);
    // A raw handler that wrote its own answer gave none to send.
    if (!ctx.res.headersSent) send(ctx.res, made);
    return;
  }
  const given = await answerOnce({
    em: ctx.em,
    userId: ctx.actor.id,
    key,
    requestHash: hashRequest(ctx.req, ctx.body),
    first: (em) => first(withEm(ctx, em)),
  });
  if (given.repeated) ctx.res.setHeader('Idempotency-Replayed', 'true');
  send(ctx.res, given);
}

/** The same context over another entity manager; a spread would call the getter of `actor`. */
function withEm(ctx: RouteContext, em: RouteContext['em']): RouteContext {
  return Object.create(ctx, { em: { value: em, enumerable: true } }) as RouteContext;
}

function toAnswer(route: Route, res: Response, body: unknown): KeptAnswer {
  const headers: Record<string, string> = {};
  const version = (body as { version?: unknown } | null | undefined)?.version;
  if (typeof version === 'number') headers.ETag = `"${version}"`;
  const usual = route.status ?? (body === undefined ? 204 : route.creates ? 201 : 200);
  return { status: res.statusCode === 200 ? usual : res.statusCode, body, headers };
}

function send(res: Response, { status, body, headers }: KeptAnswer): void {
  res.status(status).set(headers);
  if (body === undefined) res.end();
  else res.json(body);
}

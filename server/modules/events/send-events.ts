import { sessionLives } from '#server/auth/session-lives.ts';
import type { Services } from '#server/container.ts';
import type { RouteContext } from '#server/http/define-route.ts';
import { openEventStream, type EventStream } from '#server/http/event-stream.ts';
import { followProgress } from './follow-progress.ts';
import { readSubject } from './read-subject.ts';

const SESSION_CHECK_MS = 60_000;
const open = new WeakMap<Services, Set<EventStream>>();

/** Ends every stream of a process that is about to stop: it would wait for them. Browsers connect again. */
export function closeEventStreams(services: Services): void {
  for (const stream of open.get(services) ?? []) stream.close();
}

/** Sends `{state, done, total, problem}` of a subject at once and at every change, as long as the session lasts. */
export async function sendEvents(ctx: RouteContext<{ query: { subject?: string } }>): Promise<void> {
  const { em, req, res, actor, ability, services } = ctx;
  const { progress, hideProblem } = await readSubject(em, {
    subject: ctx.query.subject ?? '',
    actor,
    ability,
  });
  const { sessionID: sessionId } = req;
  // A stream that ends is no sign of life: without this, its end would prolong the session.
  Reflect.deleteProperty(req, 'session');

  const streams = open.get(services) ?? new Set<EventStream>();
  open.set(services, streams);
  const stream = openEventStream(req, res, () => {
    unfollow();
    clearInterval(guard);
    streams.delete(stream);
  });
  streams.add(stream);
  const onError = (error: unknown) => services.log.warn({ err: error }, 'an event stream met a fault');
  const unfollow = followProgress({
    subject: progress,
    listener: services.queue.listener,
    em: () => services.orm.em.fork(),
    tell: ({ state, done, total, problem }) =>
      stream.send({ state, done, total, problem: hideProblem ? null : (problem ?? null) }),
    onError,
  });
  const absoluteHours = services.config.signIn.absoluteHours;
  const guard = setInterval(() => {
    sessionLives(services.pool, { sessionId, actor, absoluteHours }).then((lives) => {
      if (!lives) stream.close();
    }, onError);
  }, SESSION_CHECK_MS);
  guard.unref();
}

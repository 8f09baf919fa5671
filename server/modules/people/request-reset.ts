import { setTimeout as wait } from 'node:timers/promises';
import type { Request } from 'express';
import type { EntityManager } from '@mikro-orm/postgresql';
import { findAccountByEmail } from '#server/auth/find-actor.ts';
import { countAttempt } from '#server/auth/throttle.ts';
import type { Services } from '#server/container.ts';
import { problem } from '#server/http/problem.ts';
import { sendLink } from '#server/modules/people/send-link.ts';
import { appendTrail } from '#server/trail/append-trail.ts';

/** Longer than the work takes for an account that exists, so that the time does not tell whether it does. */
const ANSWER_AFTER_MS = 300;
const PER_ACCOUNT = 3;
const PER_ADDRESS = 30;

/** @throws Problem 429 by address; the same silence for a known account, an unknown one, and one asked for too often */
export async function requestReset(options: {
  em: EntityManager;
  services: Services;
  req: Request;
  email: string;
}): Promise<void> {
  const { em, services, req, email } = options;
  const { windowMinutes } = services.config.signIn;
  const address = await countAttempt(services.pool, {
    key: `reset-address:${req.ip ?? 'unknown'}`,
    limit: PER_ADDRESS,
    windowMinutes,
  });
  if (address.waitSeconds) {
    throw problem(
      429,
      'reset.throttled',
      'Too many new passwords were asked for from here. Wait a while and try again.',
      {
        headers: { 'Retry-After': String(address.waitSeconds) },
      },
    );
  }
  await Promise.all([wait(ANSWER_AFTER_MS), sendIfKnown({ em, services, email })]);
}

async function sendIfKnown(options: { em: EntityManager; services: Services; email: string }): Promise<void> {
  const { em, services, email } = options;
  const { windowMinutes } = services.config.signIn;
  const account = await findAccountByEmail(services.pool, email);
  if (!account?.active) return;
  const { actor } = account;
  const counted = await countAttempt(services.pool, {
    key: `reset:${actor.id}`,
    limit: PER_ACCOUNT,
    windowMinutes,
  });
  if (counted.waitSeconds) return;
  await em.transactional(async (tx) => {
    await sendLink(tx, { config: services.config, person: actor, purpose: 'password-reset' });
    await appendTrail(tx, {
      actor: null,
      action: 'person.password-reset-asked',
      subject: { type: 'person', id: actor.id, label: actor.name },
    });
  });
}

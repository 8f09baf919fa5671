import { createHash } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Request } from 'express';
import { rows, run } from '#server/db/rows.ts';
import { problem } from '#server/http/problem.ts';

/** The first answer to a key, given again to every repeat. */
export type KeptAnswer = { status: number; body: unknown; headers: Record<string, string> };

/**
 * The key of a creating post, or null when the caller sent none.
 * @throws Problem 400 for a key that cannot be kept
 */
export function readIdempotencyKey(req: Request): string | null {
  const key = req.get('idempotency-key');
  if (key === undefined) return null;
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw problem(
      400,
      'idempotency.unreadable',
      'Idempotency-Key must be 1 to 200 visible ASCII characters.',
    );
  }
  return key;
}

export function hashRequest(req: Request, body: unknown): string {
  const text = JSON.stringify([req.method, req.originalUrl, body ?? null]);
  return createHash('sha256').update(text).digest('hex');
}

/**
 * Runs `first` once per user and key. The key's row and what `first` writes share one transaction: a repeat that
 * comes while the first still runs waits for it; a first that failed leaves no row, and the repeat is a first again.
 * @throws Problem 422 when the key was used for another request
 */
export async function answerOnce(options: {
  em: EntityManager;
  userId: string;
  key: string;
  requestHash: string;
  first: (em: EntityManager) => Promise<KeptAnswer>;
}): Promise<KeptAnswer & { repeated: boolean }> {
  const { em, userId, key, requestHash, first } = options;
  return em.transactional(async (tx) => {
    const claimed = await run(
      tx,
      'insert into idempotency (user_id, key, request_hash) values ($1, $2, $3) on conflict (user_id, key) do nothing',
      [userId, key, requestHash],
    );
    if (claimed === 0) return { ...(await keptAnswer({ em: tx, userId, key, requestHash })), repeated: true };
    const answer = await first(tx);
    await run(
      tx,
      'update idempotency set status = $3, reply = $4, headers = $5 where user_id = $1 and key = $2',
      [
        userId,
        key,
        answer.status,
        answer.body === undefined ? null : JSON.stringify(answer.body),
        JSON.stringify(answer.headers),
      ],
    );
    return { ...answer, repeated: false };
  });
}

async function keptAnswer(options: {
  em: EntityManager;
  userId: string;
  key: string;
  requestHash: string;
}): Promise<KeptAnswer> {
  const { em, userId, key, requestHash } = options;
  const [kept] = await rows<{
    request_hash: string;
    status: number | null;
    reply: unknown;
    headers: KeptAnswer['headers'] | null;
  }>(em, 'select request_hash, status, reply, headers from idempotency where user_id = $1 and key = $2', [
    userId,
    key,
  ]);
  if (kept && kept.status !== null && kept.request_hash === requestHash) {
    return { status: kept.status, body: kept.reply ?? undefined, headers: kept.headers ?? {} };
  }
  throw problem(
    422,
    'idempotency.reused',
    'This Idempotency-Key was already used for another request. Use a new key for a new request.',
  );
}

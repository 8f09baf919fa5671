import { createHash } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Request } from 'express';
import { row } from '#server/db/rows.ts';
import type { RouteContext } from '#server/http/define-route.ts';
import { answerOnce, hashRequest, readIdempotencyKey } from '#server/http/idempotency.ts';
import { discardBody } from '#server/uploads/receive-files.ts';
import type { ReceivedFile } from '#server/uploads/blob-engine.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** `repeated`: an answer to this key is kept already. */
export type UploadKey = { readonly key: string | null; readonly repeated: boolean };

/** @throws Problem 400 for a key that cannot be kept */
export async function readUploadKey(
  em: EntityManager,
  { req, actor }: { req: Request; actor: Actor },
): Promise<UploadKey> {
  try {
    const key = readIdempotencyKey(req);
    if (key === null) return { key, repeated: false };
    const kept = await row(em, 'select 1 from idempotency where user_id = $1 and key = $2', [actor.id, key]);
    return { key, repeated: kept !== null };
  } catch (error) {
    discardBody(req);
    throw error;
  }
}

/**
 * Gives the first answer to an upload again when it is repeated under its key. The files are received before the key's
 * transaction begins, so that a slow line holds no lock; the same files by name and content are the same request.
 * @throws Problem 422 when the key was used for other files or another batch
 */
export async function answerUploadOnce(
  ctx: Pick<RouteContext, 'em' | 'req' | 'res' | 'actor'>,
  options: {
    key: UploadKey;
    files: readonly ReceivedFile[];
    first: (em: EntityManager) => Promise<UploadReply>;
  },
): Promise<UploadReply> {
  const { em, req, res, actor } = ctx;
  const { key, files, first } = options;
  if (key.key === null) return first(em);
  const answer = await answerOnce({
    em,
    userId: actor.id,
    key: key.key,
    requestHash: hashRequest(req, digestOf(files)),
    first: async (tx) => ({ status: 202, body: await first(tx), headers: {} }),
  });
  if (answer.repeated) res.setHeader('Idempotency-Replayed', 'true');
  return answer.body as UploadReply;
}

function digestOf(files: readonly ReceivedFile[]): string {
  const told = files.map(({ fileName, stored, refused }) => [fileName, stored?.sha256 ?? refused?.code]);
  return createHash('sha256').update(JSON.stringify(told)).digest('hex');
}

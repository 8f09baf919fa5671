import type { EntityManager } from '@mikro-orm/postgresql';
import { stale } from '#server/http/problem.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { lockRevision } from './lock-revision.ts';
import { presentBatch } from './present-batch.ts';
import { readBatch } from './read-batch.ts';

/**
 * For a caller that says which version of the batch it saw; the batch stays locked until the transaction ends.
 * @throws Problem 404; 412 with the batch as it is now
 */
export async function ensureVersion(
  em: EntityManager,
  seen: { batchId: string; contractorId: string | null; actor: Actor; ability: Ability; version: number },
): Promise<void> {
  const { batchId: id, contractorId, version } = seen;
  await lockRevision(em, { id, contractorId });
  const batch = await readBatch(em, { id, contractorId });
  if (batch.version !== version) throw stale(presentBatch(batch, seen));
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import { BATCH_SELECT, type BatchDbRow } from './batch-select.ts';

/**
 * One batch as seen from behind the wall: `contractorId` null sees all.
 * @throws Problem 404 for another contractor's batch as for none
 */
export async function readBatch(
  em: EntityManager,
  batch: { id: string; contractorId: string | null },
): Promise<BatchDbRow> {
  const found = await row<BatchDbRow>(
    em,
    `${BATCH_SELECT} where b.id = $1 and ($2::uuid is null or b.contractor_id = $2)`,
    [batch.id, batch.contractorId],
  );
  if (!found) throw notFound();
  return found;
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { conflict } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { addInput } from './add-input.ts';
import { lockRevision, stateOf } from './lock-revision.ts';

/**
 * Checks the same files once more, on the standard, products and lots as they are now: the same bytes handed in again
 * would make no new input.
 * @throws Problem 404; 409 when the batch is handed in or there is nothing to check
 */
export async function recheckBatch(
  em: EntityManager,
  options: { batchId: string; contractorId: string | null; actor: Actor },
): Promise<void> {
  const { batchId, contractorId, actor } = options;
  await em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'upload' }, actor));
    if (revision.input === 0 && revision.n === 0)
      throw conflict('revision.empty', 'There is nothing to check yet. Upload a filled workbook first.');
    const added = await addInput(
      tx,
      { id: revision.id, input: revision.input, status: moved.status },
      { kind: 'recheck', actorId: actor.id },
    );
    await appendTrail(tx, {
      actor,
      action: 'batch.checked-again',
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: { revision: revision.n, input: added.n },
    });
  });
}

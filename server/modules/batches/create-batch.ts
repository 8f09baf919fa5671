import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/**
 * A new batch of a work order with its revision 0, numbered within the order (`17-06`).
 * @throws Problem 404 when the order is not this contractor's
 */
export async function createBatch(
  em: EntityManager,
  options: { workOrderId: string; contractorId: string | null; actor: Actor },
): Promise<{ id: string; number: string }> {
  const { workOrderId, contractorId, actor } = options;
  return em.transactional(async (tx) => {
    const order = await row<{ id: string; number: string; contractor_id: string; batch_number: string }>(
      tx,
      `update work_orders set batch_count = batch_count + 1
       where id = $1 and ($2::uuid is null or contractor_id = $2) and state = 'open'
       returning id, number, contractor_id, human_number(batch_prefix, batch_count, 2) as batch_number`,
      [workOrderId, contractorId],
    );
    if (!order) throw notFound();
    const batch = await row<{ id: string }>(
      tx,
      `insert into batches (number, work_order_id, contractor_id, created_by) values ($1, $2, $3, $4) returning id`,
      [order.batch_number, order.id, order.contractor_id, actor.id],
    );
    if (!batch) throw new Error('The new batch has no id.');
    await run(tx, 'insert into revisions (batch_id, n) values ($1, 0)', [batch.id]);
    await appendTrail(tx, {
      actor,
      action: 'batch.created',
      subject: { type: 'batch', id: batch.id, label: order.batch_number },
      payload: { workOrder: order.number },
    });
    return { id: batch.id, number: order.batch_number };
  });
}

import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';

/** The next batch of a work order, like `17-06`; takes the order's row until the transaction ends, so that numbers have no gaps. Null: no such order. */
export async function nextBatchNumber(em: EntityManager, workOrderId: string): Promise<string | null> {
  const next = await row<{ number: string }>(
    em,
    `update work_orders set batch_count = batch_count + 1 where id = $1
     returning human_number(batch_prefix, batch_count, 2) as number`,
    [workOrderId],
  );
  return next?.number ?? null;
}

/** The number of a structure's record on the register, like `R-000123`; a number drawn in a transaction that fails is not used again. */
export async function nextRecordNumber(em: EntityManager): Promise<string> {
  const next = await row<{ number: string }>(
    em,
    `select human_number('R', nextval('record_numbers'), 6) as number`,
  );
  if (next === null) throw new Error('The sequence of record numbers gave nothing.');
  return next.number;
}

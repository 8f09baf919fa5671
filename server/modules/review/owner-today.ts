import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';

/** The calendar day in the work order's zone, `YYYY-MM-DD`: what is due is due there. */
export async function ownerToday(em: EntityManager, workOrderId: string): Promise<string> {
  const found = await row<{ today: string }>(
    em,
    `select to_char(now() at time zone zone, 'YYYY-MM-DD') as today from work_orders where id = $1`,
    [workOrderId],
  );
  if (!found) throw new Error('A finding has no work order.');
  return found.today;
}

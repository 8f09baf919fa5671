import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';

/**
 * The next revision of a batch for the lines that came back; the open one where there is one already.
 * @returns its number, or null while a submitted revision must be decided first (its closing opens the next)
 */
export async function openNextRevision(
  em: EntityManager,
  options: { batchId: string; dueOn: string | null },
): Promise<number | null> {
  const newest = await row<{ n: number; status: string }>(
    em,
    'select n, status from revisions where batch_id = $1 order by n desc limit 1',
    [options.batchId],
  );
  if (!newest) return null;
  if (['draft', 'checking', 'checked'].includes(newest.status)) return newest.n;
  if (newest.status === 'submitted' || newest.status === 'in-review') return null;
  const made = await row<{ n: number }>(
    em,
    'insert into revisions (batch_id, n, due_on) values ($1, $2, $3) returning n',
    [options.batchId, newest.n + 1, options.dueOn],
  );
  return made?.n ?? null;
}

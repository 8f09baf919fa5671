import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { JOBS_CHANNEL } from '#server/jobs/create-queue.ts';

/** Gives a parked job one more attempt, now, in em's transaction. Null: no job of this id is parked; else its name. */
export async function retryParked(em: EntityManager, id: string): Promise<string | null> {
  const [job] = await rows<{ name: string }>(
    em,
    `update pgboss.job set state = 'retry', retry_limit = retry_count + 1, start_after = now(), completed_on = null
     where id = $1 and state = 'failed' returning name`,
    [id],
  );
  if (job === undefined) return null;
  await rows(em, 'select pg_notify($1, $2)', [JOBS_CHANNEL, job.name]);
  return job.name;
}

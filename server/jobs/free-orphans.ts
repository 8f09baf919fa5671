import type { Services } from '#server/container.ts';

/**
 * Jobs that a dead process left running are free again at once, not only when their time is up: while a process works on
 * a job it holds an advisory lock on it, which ends with its connection. The first seconds are left to take the lock.
 */
export async function freeOrphans(services: Services): Promise<number> {
  const { rows } = await services.pool.query<{ name: string; id: string }>(
    `select name, id from pgboss.job
     where state = 'active' and started_on < now() - interval '5 seconds' limit 100`,
  );
  let freed = 0;
  for (const job of rows) {
    const lock = `job:${job.id}`;
    const { rows: found } = await services.pool.query<{ held: boolean }>(
      `select exists (
         select from pg_locks where locktype = 'advisory' and granted
         and database = (select oid from pg_database where datname = current_database())
         and ((classid::bigint << 32) | objid::bigint) = hashtextextended($1, 0)
       ) as held`,
      [lock],
    );
    if (found[0]?.held !== false) continue;
    await services.queue.boss.fail(job.name, job.id, { message: 'The process that worked on it died.' });
    freed += 1;
  }
  return freed;
}

import type { Services } from '#server/container.ts';
import { row, rows } from '#server/db/rows.ts';
import { endAttempt, type Attempt } from '#server/jobs/end-attempt.ts';

const WITHOUT_LOCK = `
select j.name, j.id, j.retry_count as "retryCount" from pgboss.job j
where j.state = 'active' and not exists (
  select from pg_locks l where l.locktype = 'advisory' and l.granted
  and l.database = (select oid from pg_database where datname = current_database())
  and ((l.classid::bigint << 32) | l.objid::bigint) = hashtextextended('job:' || j.id, 0)
) limit 100`;

/**
 * Jobs that a dead process left running are free again at once, not only when their time is up: while a process works on
 * a job it holds an advisory lock on it, which ends with its connection. Only what was without a lock at the look before
 * too is taken for dead: a living process that lost its connection has taken its locks again by then.
 * @param seen the attempts found without a lock at the last look; changed to those of this one
 * @returns how many were freed
 */
export async function freeOrphans(services: Services, seen: Set<string>): Promise<number> {
  const found = await rows<Attempt>(services.orm.em.fork(), WITHOUT_LOCK);
  const before = new Set(seen);
  seen.clear();
  let freed = 0;
  for (const attempt of found) {
    const key = `${attempt.id}:${attempt.retryCount}`;
    if (!before.has(key)) seen.add(key);
    else if (await free(services, attempt)) freed += 1;
  }
  return freed;
}

/** The lock is held while the job is freed, so that its worker, should it come back just now, does not get it. */
function free(services: Services, attempt: Attempt): Promise<boolean> {
  return services.orm.em.fork().transactional(async (tx) => {
    const lock = await row<{ got: boolean }>(
      tx,
      'select pg_try_advisory_xact_lock(hashtextextended($1, 0)) as got',
      [`job:${attempt.id}`],
    );
    if (lock?.got !== true) return false;
    return endAttempt(services, attempt, { state: 'failed', reason: 'The process that worked on it died.' });
  });
}

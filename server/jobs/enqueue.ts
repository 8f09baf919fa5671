import type { EntityManager } from '@mikro-orm/postgresql';
import PgBoss from 'pg-boss';
import { rows } from '#server/db/rows.ts';
import { checkPayload } from '#server/jobs/check-payload.ts';
import type { JobDefinition } from '#server/jobs/define-job.ts';
import { JOBS_CHANNEL } from '#server/jobs/create-queue.ts';

/** Never started: it only forms the statement, which runs on the caller's own connection. */
const sender = new PgBoss({
  db: {
    executeSql: () => Promise.reject(new Error('A job is enqueued through the caller’s entity manager.')),
  },
  migrate: false,
  supervise: false,
  schedule: false,
});

/**
 * Puts a job on its queue in em's transaction: rolled back with it, and seen by workers, who are woken, once it commits.
 * With `key`, a job of the same key that still waits stands for this one too.
 */
export async function enqueue<P extends object>(
  em: EntityManager,
  job: JobDefinition<P>,
  payload: P,
  options: { key?: string; startAfter?: Date } = {},
): Promise<void> {
  checkPayload(job, payload);
  if (options.key !== undefined && (await waits(em, job.name, options.key))) return;
  const id = await sender.send(job.name, payload, {
    db: { executeSql: async (text, values) => ({ rows: await rows(em, text, values) }) },
    ...(options.key === undefined ? {} : { singletonKey: options.key }),
    ...(options.startAfter === undefined ? {} : { startAfter: options.startAfter }),
  });
  if (id === null) {
    throw new Error(
      `There is no queue "${job.name}": name the job in the registry and migrate the database.`,
    );
  }
  await rows(em, 'select pg_notify($1, $2)', [JOBS_CHANNEL, job.name]);
}

/** Locks the waiting job until em's transaction ends, so that no worker takes it before it can see what the transaction wrote. */
async function waits(em: EntityManager, name: string, key: string): Promise<boolean> {
  const found = await rows(
    em,
    `select id from pgboss.job where name = $1 and singleton_key = $2 and state = 'created' limit 1 for update skip locked`,
    [name, key],
  );
  return found.length > 0;
}

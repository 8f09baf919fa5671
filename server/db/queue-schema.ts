import PgBoss from 'pg-boss';
import { JOBS } from '#server/jobs/registry.ts';

/** Makes the queue's schema and one queue a job, as the owner: the library runs DDL for both, which the application's role may not. Repeatable. */
export async function migrateQueues(databaseUrl: string): Promise<void> {
  const boss = new PgBoss({ connectionString: databaseUrl, max: 1, supervise: false, schedule: false });
  boss.on('error', () => undefined);
  await boss.start();
  try {
    for (const job of JOBS) {
      const options = {
        name: job.name,
        retryLimit: job.retryLimit,
        retryDelay: job.retryDelay,
        retryBackoff: true,
        expireInSeconds: job.expireSeconds,
      };
      await boss.createQueue(job.name, options);
      // An existing queue keeps its old numbers otherwise.
      await boss.updateQueue(job.name, options);
    }
  } finally {
    await boss.stop({ graceful: false });
  }
}

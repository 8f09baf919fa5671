import type pg from 'pg';
import PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import { createListener, type Listener } from '#server/jobs/listen.ts';

export const JOBS_CHANNEL = 'upstand_jobs';
const DAY_SECONDS = 86_400;

export type Queue = {
  readonly boss: PgBoss;
  readonly listener: Listener;
  close(): Promise<void>;
};

/** The process's part in the queue. `boss` is started by the worker only; enqueueing needs no more than the transaction's connection. */
export function createQueue(options: { databaseUrl: string; pool: pg.Pool; log: Logger }): Queue {
  const onError = (error: Error) => options.log.warn({ err: error }, 'the queue met a fault and goes on');
  const boss = new PgBoss({
    db: { executeSql: (text, values) => options.pool.query(text, values) },
    migrate: false,
    schedule: false,
    supervise: true,
    maintenanceIntervalSeconds: 30,
    // Longer than the longest period of a recurring job, whose last run keeps its slot taken.
    archiveCompletedAfterSeconds: 3 * DAY_SECONDS,
    // Parked jobs wait for the administrator.
    archiveFailedAfterSeconds: 90 * DAY_SECONDS,
  });
  boss.on('error', onError);
  const listener = createListener(options.databaseUrl, onError);
  return { boss, listener, close: () => listener.close() };
}

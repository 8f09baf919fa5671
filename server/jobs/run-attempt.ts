import type PgBoss from 'pg-boss';
import type { Services } from '#server/container.ts';
import { row } from '#server/db/rows.ts';
import type { JobDefinition } from '#server/jobs/define-job.ts';
import { endAttempt } from '#server/jobs/end-attempt.ts';
import { Hopeless } from '#server/jobs/hopeless.ts';
import { settleParked } from '#server/jobs/settle-parked.ts';

/** How long the queue is asked again to write down how an attempt ended, while PostgreSQL restarts, say. */
const REPORT_PAUSES_MS = [200, 1_000, 3_000, 10_000];

const pauseFor = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

/** One attempt at one job: run it within its time, then tell the queue how it ended. Never throws. */
export async function runAttempt(options: {
  services: Services;
  definition: JobDefinition<never>;
  job: PgBoss.JobWithMetadata;
  /** Aborted when the process ends. */
  stop: AbortSignal;
}): Promise<void> {
  const { services, definition, job, stop } = options;
  const { listener } = services.queue;
  const lock = `job:${job.id}`;
  const log = { job: job.name, id: job.id, attempt: job.retryCount + 1 };
  try {
    if (!(await take(services, job, lock))) return;
    await attempt(options);
    await report(() => endAttempt(services, job, { state: 'done' }));
    services.log.info(log, 'job done');
  } catch (error) {
    services.log.error({ ...log, err: error }, stop.aborted ? 'job stopped with the process' : 'job failed');
    const hopeless = error instanceof Hopeless;
    const reason = error instanceof Error ? error.message : String(error);
    try {
      await report(() => endAttempt(services, job, { state: 'failed', reason, hopeless }));
      if (hopeless || job.retryCount >= job.retryLimit) await settleParked(services, [definition]);
    } catch (lost) {
      services.log.error(
        { ...log, err: lost },
        'how the job ended could not be written down; it will be tried again',
      );
    }
  } finally {
    await listener.letGo(lock);
  }
}

/** False: between the fetch and the lock (a stalled connection, say) the job was taken for a dead process's. */
async function take(services: Services, job: PgBoss.JobWithMetadata, lock: string): Promise<boolean> {
  if (!(await services.queue.listener.hold(lock))) return false;
  const mine = await row(
    services.orm.em.fork(),
    `select 1 from pgboss.job where name = $1 and id = $2 and state = 'active' and retry_count = $3`,
    [job.name, job.id, job.retryCount],
  );
  return mine !== null;
}

async function attempt(options: Parameters<typeof runAttempt>[0]): Promise<void> {
  const { services, definition, job, stop } = options;
  const { handler } = await definition.load();
  const signal = AbortSignal.any([stop, AbortSignal.timeout(definition.expireSeconds * 1000)]);
  const overdue = new Promise<never>((_resolve, reject) => {
    signal.addEventListener('abort', () =>
      reject(
        new Error(
          stop.aborted
            ? 'The process that worked on it was ended.'
            : `It took longer than ${definition.expireSeconds} s.`,
        ),
      ),
    );
  });
  const context = {
    services,
    em: services.orm.em.fork(),
    job: { id: job.id, attempt: job.retryCount + 1, last: job.retryCount >= job.retryLimit },
    signal,
  };
  await Promise.race([handler(job.data as never, context), overdue]);
}

async function report(write: () => Promise<unknown>): Promise<void> {
  for (const pause of REPORT_PAUSES_MS) {
    try {
      await write();
      return;
    } catch {
      await pauseFor(pause);
    }
  }
  await write();
}

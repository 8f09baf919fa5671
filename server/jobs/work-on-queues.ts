import type { Services } from '#server/container.ts';
import type { JobDefinition } from '#server/jobs/define-job.ts';
import { freeOrphans } from '#server/jobs/free-orphans.ts';
import { JOBS_CHANNEL } from '#server/jobs/create-queue.ts';
import { runAttempt } from '#server/jobs/run-attempt.ts';
import { settleParked } from '#server/jobs/settle-parked.ts';

/** A notification wakes a loop at once; this only catches what one missed, and jobs whose pause is over. */
const POLL_MS = 2_000;
/** A dead process is noticed at the second look without its lock: its jobs are free within twice this. */
const CHORES_MS = 3_000;
const GRACE_MS = 10_000;

export type Worker = { stop(): Promise<void> };

/** Works on the queues of these jobs until it is stopped. Any number of processes may. */
export async function workOnQueues(
  services: Services,
  jobs: readonly JobDefinition<never>[],
): Promise<Worker> {
  const { boss, listener } = services.queue;
  const stopping = new AbortController();
  const ended = new AbortController();
  const withoutLock = new Set<string>();
  const sleepers = new Set<{ name: string; wake: () => void }>();
  const wake = (name: string | null): void => {
    for (const sleeper of sleepers) if (name === null || sleeper.name === name) sleeper.wake();
  };
  const sleep = (name: string): Promise<void> =>
    new Promise((resolve) => {
      const timer = setTimeout(() => sleeper.wake(), POLL_MS);
      const sleeper = {
        name,
        wake: () => {
          clearTimeout(timer);
          sleepers.delete(sleeper);
          resolve();
        },
      };
      sleepers.add(sleeper);
      if (stopping.signal.aborted) sleeper.wake();
    });

  const loop = async (definition: JobDefinition<never>): Promise<void> => {
    while (!stopping.signal.aborted) {
      try {
        const [job] = await boss.fetch<object>(definition.name, { includeMetadata: true });
        if (job === undefined) await sleep(definition.name);
        else await runAttempt({ services, definition, job, stop: ended.signal });
      } catch (error) {
        services.log.error({ err: error, job: definition.name }, 'the queue could not be read');
        await sleep(definition.name);
      }
    }
  };

  const chores = async (): Promise<void> => {
    try {
      if ((await freeOrphans(services, withoutLock)) > 0) wake(null);
      await settleParked(services, jobs);
      for (const job of jobs) {
        if (job.everySeconds === null) continue;
        // Over all processes one in each slot: the queue's own throttle.
        const sent = await boss.send(
          job.name,
          {},
          { singletonSeconds: job.everySeconds, singletonKey: 'every' },
        );
        if (sent !== null) wake(job.name);
      }
    } catch (error) {
      services.log.error({ err: error }, 'the chores of the queue could not be done');
    }
  };

  await boss.start();
  const off = listener.on(JOBS_CHANNEL, wake);
  const loops = jobs.flatMap((job) => Array.from({ length: job.concurrency }, () => loop(job)));
  let chore = chores();
  const timer = setInterval(() => {
    chore = chore.then(chores);
  }, CHORES_MS);

  return {
    async stop() {
      off();
      clearInterval(timer);
      stopping.abort();
      wake(null);
      const grace = setTimeout(() => ended.abort(), GRACE_MS);
      await Promise.all([...loops, chore]);
      clearTimeout(grace);
      await boss.stop({ graceful: false });
    },
  };
}

import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createServices, type Services } from '#server/container.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { createQueue } from '#server/jobs/create-queue.ts';
import { defineJob, type JobDefinition, type JobHandler } from '#server/jobs/define-job.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { endAttempt } from '#server/jobs/end-attempt.ts';
import { freeOrphans } from '#server/jobs/free-orphans.ts';
import { Hopeless } from '#server/jobs/hopeless.ts';
import { listParked } from '#server/jobs/list-parked.ts';
import { PROGRESS_CHANNEL, readProgress, setProgress } from '#server/jobs/progress.ts';
import { retryParked } from '#server/jobs/retry-parked.ts';
import { settleParked } from '#server/jobs/settle-parked.ts';
import { workOnQueues } from '#server/jobs/work-on-queues.ts';
import { cloneDatabase, type TestDatabase } from '#tests/setup/clone-database.ts';
import { drainJobs } from '#tests/setup/drain-jobs.ts';
import { testConfig } from '#tests/setup/test-config.ts';

let database: TestDatabase;
let services: Services;
let done: () => void;
let handler: JobHandler<{ n: number }>;

/** Stands on the queue of a real job, whose own handler is not asked. */
const job = defineJob<{ n: number }>({
  name: 'send-mail',
  payload: {
    type: 'object',
    required: ['n'],
    properties: { n: { type: 'integer' } },
    additionalProperties: false,
  },
  load: () => Promise.resolve({ handler }),
});
const jobs = [job] as readonly JobDefinition<never>[];
const em = () => services.orm.em.fork();

beforeAll(async () => {
  database = await cloneDatabase();
  const made = await testConfig(database);
  done = made.done;
  services = await createServices(made.config);
});
afterAll(async () => {
  await services.close();
  await database.drop();
  done();
});
beforeEach(() => run(em(), 'delete from pgboss.job'));

async function work(): Promise<void> {
  const worker = await workOnQueues(services, jobs);
  await drainJobs(services.pool);
  await worker.stop();
}

it('a job is gone with the transaction that enqueued it', async () => {
  const seen: number[] = [];
  handler = ({ n }) => Promise.resolve(void seen.push(n));
  const refused = em().transactional(async (tx) => {
    await enqueue(tx, job, { n: 1 });
    throw new Error('rolled back on purpose');
  });
  await expect(refused).rejects.toThrow('rolled back on purpose');
  await em().transactional((tx) => enqueue(tx, job, { n: 2 }));
  await work();
  expect(seen).toEqual([2]);
});

it('a worker that rests is woken by the commit', async () => {
  const seen: number[] = [];
  handler = ({ n }) => Promise.resolve(void seen.push(n));
  const worker = await workOnQueues(services, jobs);
  for (const n of [1, 2, 3]) await em().transactional((tx) => enqueue(tx, job, { n }));
  await drainJobs(services.pool);
  await worker.stop();
  expect(seen).toEqual([1, 2, 3]);
});

it('a payload that does not fit never reaches the queue', async () => {
  await expect(enqueue(em(), job, { n: 1.5 })).rejects.toThrow('send-mail');
  expect(await rows(em(), 'select id from pgboss.job')).toEqual([]);
});

it('a waiting job of the same key stands for the new one; another key does not', async () => {
  for (const key of ['a', 'a', 'b']) await em().transactional((tx) => enqueue(tx, job, { n: 1 }, { key }));
  expect(await rows(em(), 'select singleton_key as key from pgboss.job order by 1')).toEqual([
    { key: 'a' },
    { key: 'b' },
  ]);
});

it('a job whose attempts are used up is parked with its reason, and runs again when asked to', async () => {
  handler = () => Promise.reject(new Error('the pump is dry'));
  await em().transactional((tx) => enqueue(tx, job, { n: 7 }));
  await run(em(), 'update pgboss.job set retry_limit = 0');
  await work();
  const parked = await listParked(em());
  expect(parked).toMatchObject([
    { name: 'send-mail', payload: { n: 7 }, attempts: 1, problem: 'the pump is dry' },
  ]);

  const seen: { n: number; attempt: number; last: boolean }[] = [];
  handler = ({ n }, context) =>
    Promise.resolve(void seen.push({ n, attempt: context.job.attempt, last: context.job.last }));
  const id = parked[0]?.id ?? '';
  expect(await retryParked(em(), id)).toBe('send-mail');
  await work();
  expect(seen).toEqual([{ n: 7, attempt: 2, last: true }]);
  expect(await listParked(em())).toEqual([]);
  expect(await retryParked(em(), id)).toBe(null);
});

describe('a parked job tells its subject once, and the trail,', () => {
  const told: { n: number; reason: string }[] = [];
  const parting = defineJob<{ n: number }>({
    ...job,
    expireSeconds: 1,
    loadParked: () =>
      Promise.resolve({ parked: ({ n }, { reason }) => Promise.resolve(void told.push({ n, reason })) }),
  });
  const part = async (retryLimit: number): Promise<void> => {
    told.length = 0;
    await em().transactional((tx) => enqueue(tx, parting, { n: 3 }));
    await run(em(), 'update pgboss.job set retry_limit = $1', [retryLimit]);
    const worker = await workOnQueues(services, [parting] as readonly JobDefinition<never>[]);
    await drainJobs(services.pool);
    await worker.stop();
    await settleParked(services, [parting] as readonly JobDefinition<never>[]);
  };
  const entries = () =>
    rows(
      em(),
      `select payload_text::jsonb as payload from trail where action = 'job.parked' order by seq desc limit 1`,
    );

  it('when its last attempt takes too long', async () => {
    handler = () => new Promise(() => undefined);
    await part(0);
    const reason = 'It took longer than 1 s.';
    expect(told).toEqual([{ n: 3, reason }]);
    expect(await entries()).toEqual([{ payload: { name: 'send-mail', attempts: 1, reason } }]);
  });

  it('when its handler knows that no repeat can succeed', async () => {
    handler = () => Promise.reject(new Hopeless('there is no such pump'));
    await part(5);
    expect(told).toEqual([{ n: 3, reason: 'there is no such pump' }]);
  });

  it('and not while attempts are left', async () => {
    handler = () => Promise.reject(new Error('the pump is dry'));
    await part(5);
    expect(told).toEqual([]);
    expect(await rows(em(), 'select state::text from pgboss.job')).toEqual([{ state: 'retry' }]);
  });
});

it('an attempt that was taken for dead and comes back writes nothing', async () => {
  await em().transactional((tx) => enqueue(tx, job, { n: 1 }));
  const fetchOne = () => services.queue.boss.fetch<object>(job.name, { includeMetadata: true });
  const [first] = await fetchOne();
  const attempt = { name: job.name, id: first?.id ?? '', retryCount: 0 };
  expect(await endAttempt(services, attempt, { state: 'failed', reason: 'taken for dead' })).toBe(true);
  await run(em(), "update pgboss.job set start_after = now() - interval '1 second'");
  await fetchOne();
  for (const state of ['done', 'failed'] as const)
    expect(await endAttempt(services, attempt, { state, reason: 'late' })).toBe(false);
  expect(await rows(em(), 'select state::text, retry_count from pgboss.job')).toEqual([
    { state: 'active', retry_count: 1 },
  ]);
});

it('a job left running by a process that died is free again; one that is worked on is not', async () => {
  await em().transactional((tx) => enqueue(tx, job, { n: 1 }));
  await em().transactional((tx) => enqueue(tx, job, { n: 2 }));
  const taken = [
    ...(await services.queue.boss.fetch(job.name)),
    ...(await services.queue.boss.fetch(job.name)),
  ];
  await run(em(), `update pgboss.job set started_on = now() - interval '1 minute'`);
  await services.queue.listener.hold(`job:${taken[0]?.id}`);
  const seen = new Set<string>();
  // A worker that has just lost its connection looks like this too: only the second look counts.
  expect(await freeOrphans(services, seen)).toBe(0);
  expect(await freeOrphans(services, seen)).toBe(1);
  await services.queue.listener.letGo(`job:${taken[0]?.id}`);
  const states = await rows(em(), 'select id, state::text from pgboss.job order by state');
  expect(states).toEqual([
    { id: taken[0]?.id, state: 'active' },
    { id: taken[1]?.id, state: 'retry' },
  ]);
});

it('the queue’s own upkeep needs no more than the application’s rights', async () => {
  handler = () => Promise.resolve();
  await em().transactional((tx) => enqueue(tx, job, { n: 1 }));
  await work();
  await em().transactional((tx) => enqueue(tx, job, { n: 2 }));
  await services.queue.boss.fetch(job.name);
  await run(
    em(),
    `update pgboss.job set completed_on = completed_on - interval '9 days', started_on = started_on - interval '9 days'`,
  );
  // One that was stopped does no more upkeep.
  const fresh = createQueue({ databaseUrl: database.appUrl, pool: services.pool, log: services.log });
  await fresh.boss.start();
  await fresh.boss.maintain();
  await fresh.boss.stop({ graceful: false });
  await fresh.close();
  expect(await rows(em(), `select data -> 'n' as n, state::text from pgboss.job`)).toEqual([
    { n: 2, state: 'retry' },
  ]);
  expect(await rows(em(), `select data -> 'n' as n from pgboss.archive`)).toEqual([{ n: 1 }]);
});

it('progress is kept and told, also after the connection that listens was cut', async () => {
  const told: (string | null)[] = [];
  const heard = (): Promise<string | null> =>
    new Promise((resolve) => {
      const off = services.queue.listener.on(PROGRESS_CHANNEL, (subject) => {
        if (subject === null) return;
        told.push(subject);
        off();
        resolve(subject);
      });
    });
  const again = (): Promise<void> =>
    new Promise((resolve) => {
      const off = services.queue.listener.on(PROGRESS_CHANNEL, (subject) => {
        if (subject !== null) return;
        off();
        resolve();
      });
    });
  const ready = again();
  await ready;
  const first = heard();
  await setProgress(em(), { subject: 'check:1', state: 'running', done: 3, total: 10 });
  expect(await first).toBe('check:1');

  const reconnected = again();
  const { rows: cut } = await services.pool.query(
    `select pg_terminate_backend(pid) as cut from pg_stat_activity where application_name = 'upstand-listen' and datname = current_database()`,
  );
  expect(cut).toEqual([{ cut: true }]);
  await reconnected;
  const second = heard();
  await setProgress(em(), { subject: 'check:1', state: 'done', done: 10, total: 10 });
  expect(await second).toBe('check:1');
  expect(await readProgress(em(), 'check:1')).toMatchObject({
    state: 'done',
    done: 10,
    total: 10,
    problem: null,
  });
  expect(await row(em(), 'select count(*) as n from job_progress')).toEqual({ n: 1 });
});

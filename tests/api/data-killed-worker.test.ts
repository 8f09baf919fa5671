import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { createServices, type Services } from '#server/container.ts';
import { rows } from '#server/db/rows.ts';
import { defineJob, type JobDefinition } from '#server/jobs/define-job.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { workOnQueues } from '#server/jobs/work-on-queues.ts';
import { cloneDatabase, type TestDatabase } from '#tests/setup/clone-database.ts';
import { drainJobs } from '#tests/setup/drain-jobs.ts';
import { testConfig } from '#tests/setup/test-config.ts';

let database: TestDatabase;
let services: Services;
let done: () => void;
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

it('a job of a worker that was killed is done by another, long before its time is up', async () => {
  const attempts: number[] = [];
  const job = defineJob<object>({
    name: 'send-mail',
    payload: { type: 'object' },
    load: () =>
      Promise.resolve({
        handler: (_payload, context) => Promise.resolve(void attempts.push(context.job.attempt)),
      }),
  });
  await em().transactional((tx) => enqueue(tx, job, {}));
  const child = spawn(process.execPath, ['--import', 'tsx', 'tests/fixtures/hanging-worker.ts'], {
    env: {
      ...process.env,
      DATABASE_URL: database.ownerUrl,
      DATABASE_APP_URL: database.appUrl,
      AZURE_STORAGE_CONNECTION_STRING: database.storage,
      SESSION_SECRET: services.config.sessionSecret,
      DATA_DIR: services.config.dataDir,
      LOG_LEVEL: 'silent',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  await once(child.stdout, 'data');
  child.kill('SIGKILL');
  await once(child, 'exit');
  expect(await rows(em(), 'select state::text from pgboss.job')).toEqual([{ state: 'active' }]);

  const worker = await workOnQueues(services, [job] as readonly JobDefinition<never>[]);
  // Its time is 120 s; this test's own limit is 90 s.
  await drainJobs(services.pool);
  // Freed, it rests for the pause before a repeat.
  await services.pool.query(`update pgboss.job set start_after = now() where state = 'retry'`);
  await drainJobs(services.pool);
  await worker.stop();
  expect(attempts).toEqual([2]);
  expect(await rows(em(), 'select state::text, retry_count from pgboss.job')).toEqual([
    { state: 'completed', retry_count: 1 },
  ]);
}, 90_000);

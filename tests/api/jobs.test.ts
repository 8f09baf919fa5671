import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { row, run } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { checkRevisionJob } from '#server/modules/check/check-revision.job.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

const REVISION = '00000000-0000-4000-8000-000000000001';
let harness: Harness;
let admin: Agent;

beforeAll(async () => {
  harness = await createHarness();
  admin = await harness.signIn('administrator');
});
afterAll(() => harness.close());

/** A job as the queue leaves it when its last attempt failed. */
async function park(): Promise<string> {
  await harness.em().transactional((tx) => enqueue(tx, checkRevisionJob, { revisionId: REVISION, input: 1 }));
  const parked = await row<{ id: string }>(
    harness.em(),
    `update pgboss.job set state = 'failed', retry_count = 5, completed_on = now(), output = '{"message":"the disk is full"}'
     where name = $1 and state = 'created' returning id`,
    [checkRevisionJob.name],
  );
  if (!parked) throw new Error('No job was parked.');
  return parked.id;
}

describe('parked jobs', () => {
  it('say what stands still, why, and what it means', async () => {
    const id = await park();
    const reply = await admin.get('/api/jobs/parked');
    expect(reply.status).toBe(200);
    expect(reply.body.items).toEqual([
      expect.objectContaining({
        id,
        name: 'check-revision',
        title: 'Check a batch',
        about: null,
        problem: 'the disk is full',
        payload: { revisionId: REVISION, input: 1 },
        attempts: 6,
        can: ['retry'],
      }),
    ]);
  });

  it('run again when asked to, which stands in the trail', async () => {
    const [job] = (await admin.get('/api/jobs/parked')).body.items as { id: string }[];
    expect((await admin.post(`/api/jobs/parked/${job?.id}/retry`)).status).toBe(204);
    expect((await admin.get('/api/jobs/parked')).body.items).toEqual([]);
    const queued = await row(harness.em(), 'select state::text from pgboss.job where id = $1', [job?.id]);
    expect(queued).toEqual({ state: 'retry' });
    const entry = (await admin.get('/api/trail?action=job.retried')).body.items[0];
    expect(entry).toMatchObject({
      title: 'Parked job tried again',
      subject: { type: 'job', id: job?.id, label: 'Check a batch' },
      payload: { name: 'check-revision' },
    });
    expect((await admin.post(`/api/jobs/parked/${job?.id}/retry`)).status).toBe(404);
  });

  it('are the administrator’s alone', async () => {
    await run(harness.em(), `update pgboss.job set state = 'failed' where state = 'retry'`);
    const [job] = (await admin.get('/api/jobs/parked')).body.items as { id: string }[];
    for (const role of ['contractor', 'clerk', 'auditor'] as const) {
      const agent = await harness.signIn(role);
      expect((await agent.get('/api/jobs/parked')).status).toBe(403);
      expect((await agent.post(`/api/jobs/parked/${job?.id}/retry`)).status).toBe(403);
    }
    expect((await admin.get('/api/jobs/parked')).body.items).toHaveLength(1);
  });
});

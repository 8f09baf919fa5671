import { afterAll, beforeAll, expect, it } from 'vitest';
import { row, run } from '#server/db/rows.ts';
import { handIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let admin: Agent;
let clerk: Agent;

beforeAll(async () => {
  harness = await createHarness();
  admin = await harness.signIn('administrator');
  clerk = await harness.signIn('clerk');
  const site = await createWorkSite(harness, { planned: ['L-1'], number: '17' });
  const agent = await harness.signIn(site.contractor);
  const batch = await handIn(harness, { site, agent, set: [setRow('L-1')] });
  const inspector = await harness.signIn('inspector');
  await inspector.post(`/api/batches/${batch.id}/take`);
  await inspector.post(`/api/batches/${batch.id}/approve-clean`);
  await inspector.post(`/api/batches/${batch.id}/close-review`);
  const [waiting] = (await clerk.get('/api/register/candidates')).body.items as { recordId: string }[];
  const entered = await clerk.post('/api/register/entries').send({ recordIds: [waiting?.recordId] });
  if (entered.status !== 201) throw new Error(entered.text);
});
afterAll(() => harness.close());

/** Leaves the transmittal and its job as the last failed attempt does. */
async function fail(id: string): Promise<string> {
  await run(harness.em(), `update transmittals set state = 'failed', problem = $2 where id = $1`, [
    id,
    JSON.stringify({ code: 'transmittal.failed', detail: 'The workbook could not be written.' }),
  ]);
  const job = await row<{ id: string }>(
    harness.em(),
    `update pgboss.job set state = 'failed', retry_count = 5, completed_on = now()
     where name = 'issue-transmittal' and data ->> 'transmittalId' = $1 returning id`,
    [id],
  );
  if (!job) throw new Error('The transmittal has no job.');
  return job.id;
}

it('a transmittal that failed is issued when its parked job is tried again', async () => {
  const asked = await clerk.post('/api/transmittals').send({ scope: { filter: {} } });
  const job = await fail(asked.body.id);
  const failed = (await clerk.get(`/api/transmittals/${asked.body.id}`)).body;
  expect([failed.state, failed.problem]).toEqual(['failed', 'The workbook could not be written.']);

  expect((await admin.post(`/api/jobs/parked/${job}/retry`)).status).toBe(204);
  await harness.drain();
  const issued = (await clerk.get(`/api/transmittals/${asked.body.id}`)).body;
  expect([issued.state, issued.rows, issued.problem]).toEqual(['issued', 1, null]);
});

it('a revision that failed keeps its number; issuing again takes the next', async () => {
  const [first] = (await clerk.get('/api/transmittals')).body.items as { id: string; number: string }[];
  const again = { scope: { filter: {} }, supersedes: first?.id };
  const second = await clerk.post('/api/transmittals').send(again);
  expect([second.status, second.body.number, second.body.revision]).toEqual([202, first?.number, 1]);
  await fail(second.body.id);
  const third = await clerk.post('/api/transmittals').send(again);
  expect([third.status, third.body.number, third.body.revision]).toEqual([202, first?.number, 2]);
});

it('a record number that is not on the register is named', async () => {
  const reply = await clerk
    .post('/api/transmittals')
    .send({ scope: { recordNumbers: ['R-000001', 'R-999999'] } });
  expect([reply.status, reply.body.detail]).toEqual([422, 'Not on the register: R-999999.']);
});

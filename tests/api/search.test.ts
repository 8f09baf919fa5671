import { afterAll, beforeAll, expect, it } from 'vitest';
import { createSubmittedBatch } from '#tests/factories/submitted-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['17-0401'], number: '17' });
  await createSubmittedBatch(harness.em(), {
    workOrder: { id: site.order.id, contractorId: site.contractor.orgId },
    lines: [{ structureNumber: '17-0401', findings: [] }],
  });
});
afterAll(() => harness.close());

const labels = (reply: { body: { items: { type: string; label: string }[] } }) =>
  reply.body.items.map((hit) => `${hit.type} ${hit.label}`);

it('finds what begins with the number, of every kind the person may read', async () => {
  const inspector = await harness.signIn('inspector');
  expect(labels(await inspector.get('/api/search?q=17'))).toEqual([
    'structure 17-0401',
    'batch 17-01',
    'work-order 17',
  ]);
  expect(labels(await inspector.get(`/api/search?q=${site.lot.number}`))).toEqual([`lot ${site.lot.number}`]);
  expect((await inspector.get('/api/search?q=')).status).toBe(400);
});

it('takes no character of the query for a pattern', async () => {
  const inspector = await harness.signIn('inspector');
  expect(labels(await inspector.get('/api/search?q=%25'))).toEqual([]);
  expect(labels(await inspector.get('/api/search?q=1_'))).toEqual([]);
});

it('shows a contractor nothing of another, and no lots', async () => {
  const foreign = await harness.signIn('contractor');
  expect(labels(await foreign.get('/api/search?q=17'))).toEqual([]);
  const own = await harness.signIn(site.contractor);
  expect(labels(await own.get('/api/search?q=17'))).toEqual([
    'structure 17-0401',
    'batch 17-01',
    'work-order 17',
  ]);
  expect(labels(await own.get(`/api/search?q=${site.lot.number}`))).toEqual([]);
});

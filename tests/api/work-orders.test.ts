import { read, utils } from '@e965/xlsx';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createSubmittedBatch } from '#tests/factories/submitted-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let own: Agent;
let foreign: Agent;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, {
    planned: ['L-1', { structureNumber: 'L-2', design: { poleLengthFt: 45, poleClass: '3' } }],
  });
  own = await harness.signIn(site.contractor);
  foreign = await harness.signIn('contractor');
});
afterAll(() => harness.close());

describe('work orders', () => {
  it('are listed and read by their own contractor', async () => {
    const list = await own.get('/api/work-orders');
    expect(list.body).toMatchObject({
      total: 1,
      nextCursor: null,
      items: [{ id: site.order.id, structures: 2 }],
    });
    const one = await own.get(`/api/work-orders/${site.order.id}`);
    expect(one.body).toMatchObject({
      number: site.order.number,
      progress: { planned: 2, inBatch: 0, approved: 0, onRecord: 0 },
      openBatch: null,
      can: ['create-batch'],
    });
    expect(one.headers['etag']).toBe('"1"');
  });

  it.each(['', '/structures', '/template.xlsx'])('are a wall to another contractor: %s', async (part) => {
    expect((await own.get(`/api/work-orders/${site.order.id}${part}`)).status).toBe(200);
    expect((await foreign.get(`/api/work-orders/${site.order.id}${part}`)).status).toBe(404);
    expect((await foreign.get('/api/work-orders')).body).toMatchObject({ items: [], total: 0 });
    expect((await foreign.post(`/api/work-orders/${site.order.id}/batches`)).status).toBe(404);
  });

  it('show their design list', async () => {
    const { body } = await own.get(`/api/work-orders/${site.order.id}/structures`);
    expect(body.items).toMatchObject([
      { structureNumber: 'L-1', kind: 'set', state: 'planned', design: { poleLengthFt: 40, poleClass: '4' } },
      { structureNumber: 'L-2', kind: 'set', state: 'planned', design: { poleLengthFt: 45, poleClass: '3' } },
    ]);
  });

  it('give out a template filled with the design list', async () => {
    const reply = await own.get(`/api/work-orders/${site.order.id}/template.xlsx`).responseType('blob');
    expect(reply.headers['content-disposition']).toContain(`${site.order.number} template.xlsx`);
    const book = read(reply.body as Buffer);
    const [keys, , , first, second] = utils.sheet_to_json<unknown[]>(book.Sheets['Set'] ?? {}, { header: 1 });
    const column = (keys ?? []).indexOf('structureNumber');
    expect([first?.[column], second?.[column]]).toEqual(['L-1', 'L-2']);
  });

  it('are made by an administrator alone', async () => {
    const body = {
      number: 'WO-88',
      title: 'Rebuild',
      contractorId: site.contractor.orgId,
      zone: 'America/Chicago',
      batchPrefix: '88',
      structures: [{ structureNumber: 'L-2', kind: 'straighten', design: { latitude: 41, longitude: -97 } }],
    };
    const administrator = await harness.signIn('administrator');
    expect((await own.post('/api/work-orders').send(body)).status).toBe(403);
    const made = await administrator.post('/api/work-orders').set('Idempotency-Key', 'once').send(body);
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({ number: 'WO-88', structures: 1, can: [] });
    const again = await administrator.post('/api/work-orders').set('Idempotency-Key', 'once').send(body);
    expect(again.body.id).toBe(made.body.id);
    const taken = await administrator.post('/api/work-orders').send(body);
    expect(taken.body).toMatchObject({ status: 409, code: 'work-order.number-taken' });
    expect((await own.get('/api/work-orders')).body.total).toBe(2);
  });

  it.each([
    ['/zone', { zone: 'Nowhere/Land' }],
    ['/contractorId', { contractorId: '00000000-0000-4000-8000-000000000000' }],
    [
      '/structures/1/structureNumber',
      {
        structures: [
          { structureNumber: 'A-1', kind: 'set', design: {} },
          { structureNumber: ' a-1', kind: 'set', design: {} },
        ],
      },
    ],
  ])('are refused with the place: %s', async (pointer, change) => {
    const administrator = await harness.signIn('administrator');
    const body = {
      number: 'WO-89',
      title: 'Rebuild',
      contractorId: site.contractor.orgId,
      zone: 'America/Chicago',
      structures: [{ structureNumber: 'A-1', kind: 'set', design: {} }],
      ...change,
    };
    const reply = await administrator.post('/api/work-orders').send(body);
    expect(reply.status).toBe(422);
    expect(reply.body.errors).toMatchObject([{ pointer }]);
  });
});

describe('a review that goes on', () => {
  it('is told neither to the contractor nor to the clerk before it is closed', async () => {
    const inspector = await harness.signIn('inspector');
    const clerk = await harness.signIn('clerk');
    const em = harness.services.orm.em.fork();
    const batch = await createSubmittedBatch(em, {
      workOrder: { id: site.order.id, contractorId: site.contractor.orgId },
      lines: [{ structureNumber: 'L-1', findings: [] }],
    });
    const stateFor = async (agent: Agent): Promise<unknown> =>
      (await agent.get(`/api/work-orders/${site.order.id}/structures`)).body.items[0]?.state;
    const toEnter = async (): Promise<unknown> =>
      (await clerk.get('/api/home')).body.items.find(({ key }: { key: string }) => key === 'to-enter')?.count;

    expect((await inspector.post(`/api/batches/${batch.id}/take`)).status).toBe(200);
    expect((await inspector.post(`/api/batches/${batch.id}/approve-clean`)).status).toBe(200);
    expect([await stateFor(own), await stateFor(inspector), await toEnter()]).toEqual([
      'in-batch',
      'approved',
      undefined,
    ]);
    expect((await inspector.post(`/api/batches/${batch.id}/close-review`)).status).toBe(200);
    expect([await stateFor(own), await toEnter()]).toEqual(['approved', 1]);
  });
});

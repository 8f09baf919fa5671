import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rows } from '#server/db/rows.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let administrator: Agent;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1'] });
  administrator = await harness.signIn('administrator');
});
afterAll(() => harness.close());

describe('lots', () => {
  it('are entered, received and balanced', async () => {
    const made = await administrator
      .post('/api/lots')
      .send({ productId: site.product.id, number: 'N-7', expiresOn: '2027-06-30' });
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({
      number: 'N-7',
      status: 'in-use',
      balanceFt3: 0,
      expiresOn: '2027-06-30',
    });
    const received = await administrator
      .post(`/api/lots/${made.body.id}/events`)
      .send({ type: 'received', kitFt3: 2.5, quantity: 40 });
    // 40 kits of 2.5 ft³.
    expect(received.body).toMatchObject({
      receivedFt3: 100,
      usedFt3: 0,
      balanceFt3: 100,
      events: [{ quantity: 40 }],
    });
    const twice = await administrator.post('/api/lots').send({ productId: site.product.id, number: 'N-7' });
    expect(twice.body).toMatchObject({ status: 409, code: 'lot.number-taken' });
  });

  it.each([
    ['/quantity', { type: 'received', kitFt3: 4 }],
    ['/reason', { type: 'held', reason: ' ' }],
  ])('need what their event needs: %s', async (pointer, body) => {
    const reply = await administrator.post(`/api/lots/${site.lot.id}/events`).send(body);
    expect(reply.status).toBe(422);
    expect(reply.body.errors).toMatchObject([{ pointer }]);
  });

  it('show where they went, and tell who used them when they are held', async () => {
    const contractor = await harness.signIn(site.contractor);
    const created = await contractor.post(`/api/work-orders/${site.order.id}/batches`);
    const batch = `/api/batches/${created.body.id}`;
    const workbook = await workbookFile({
      workOrder: site.order.number,
      set: [setRow('L-1')],
      pours: pourRows('L-1', site.lot.number),
    });
    await contractor.put(`${batch}/workbook`).attach('workbook', workbook, 'batch.xlsx');
    await harness.drain();
    // A draft uses nothing yet.
    expect((await administrator.get(`/api/lots/${site.lot.id}`)).body).toMatchObject({
      usedFt3: 0,
      uses: [],
    });
    expect((await contractor.post(`${batch}/submit`)).status).toBe(200);
    const used = await administrator.get(`/api/lots/${site.lot.id}`);
    // Kits of 8 and 1.5 ft³ out of 100 of 4 ft³ and 1,000 of 1.5, 2.5, 6 and 8 ft³ each: 400 + 18,000.
    expect(used.body).toMatchObject({
      receivedFt3: 18_400,
      usedFt3: 9.5,
      balanceFt3: 18_390.5,
      structures: 1,
      uses: [{ structureNumber: 'L-1', usedFt3: 9.5, batch: { number: created.body.number } }],
    });

    const held = await administrator
      .post(`/api/lots/${site.lot.id}/events`)
      .send({ type: 'held', reason: 'Expansion short in the maker’s test.' });
    expect(held.body).toMatchObject({ status: 'held', can: ['receive', 'release', 'recall'] });
    const mail = await rows<{ recipient: string; structures: string[] }>(
      harness.em(),
      `select recipient, data -> 'structures' as structures from outbox where template = 'lot-blocked'`,
    );
    expect(mail).toEqual([{ recipient: site.contractor.email, structures: ['L-1'] }]);
    const again = await administrator
      .post(`/api/lots/${site.lot.id}/events`)
      .send({ type: 'held', reason: 'Again.' });
    expect(again.body).toMatchObject({ status: 409, code: 'lot.held' });
  });

  it('are read by the owner’s people, and not by a contractor', async () => {
    const inspector = await harness.signIn('inspector');
    const contractor = await harness.signIn(site.contractor);
    expect((await inspector.get('/api/lots')).status).toBe(200);
    expect((await inspector.post('/api/lots').send({ productId: site.product.id, number: 'X' })).status).toBe(
      403,
    );
    expect((await contractor.get('/api/lots')).status).toBe(403);
    expect((await contractor.get(`/api/lots/${site.lot.id}`)).status).toBe(403);
    expect((await contractor.get('/api/products')).body.items).toMatchObject([{ code: 'EP-15', n: 1 }]);
  });

  it('belong to products that an administrator enters by versions', async () => {
    const body = { ...DEMO_PRODUCT, code: 'EP-20', name: 'EP-20 foam' };
    const made = await administrator.post('/api/products').send({ effectiveOn: '2026-01-01', body });
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({ code: 'EP-20', n: 1 });
    const next = await administrator.post('/api/products').send({ effectiveOn: '2026-06-01', body });
    expect(next.body).toMatchObject({ id: made.body.id, n: 2 });
    const taken = await administrator.post('/api/products').send({ effectiveOn: '2026-06-01', body });
    expect(taken.body).toMatchObject({ status: 409, code: 'product.day-taken' });
    const { kitsFt3: _, ...lacking } = body;
    const refused = await administrator
      .post('/api/products')
      .send({ effectiveOn: '2026-07-01', body: lacking });
    expect(refused.body).toMatchObject({
      status: 422,
      errors: [{ pointer: '/body/kitsFt3', code: 'required' }],
    });
    const inspector = await harness.signIn('inspector');
    expect((await inspector.post('/api/products').send({ effectiveOn: '2026-08-01', body })).status).toBe(
      403,
    );
    expect((await inspector.get(`/api/products/${made.body.id}`)).body.n).toBe(2);
  });

  it('answer 400 to a cursor that was not given out', async () => {
    const reply = await administrator.get('/api/lots?cursor=nonsense');
    expect(reply.status).toBe(400);
    expect(reply.body.errors).toMatchObject([{ pointer: '#/query/cursor' }]);
  });
});

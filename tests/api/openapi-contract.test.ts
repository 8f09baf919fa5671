import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROUTES } from '#server/http/routes.ts';
import { PASSWORD } from '#tests/factories/people.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import { buildWorld, type World } from './authorisation/world.ts';
import { differences, type Shape } from './contract/shape.ts';
import * as shapes from './contract/shapes.ts';

let harness: Harness;
let world: World;
beforeAll(async () => {
  harness = await createHarness();
  world = await buildWorld(harness);
}, 180_000);
afterAll(() => harness?.close());

type Reply = { status: number; body: unknown; headers: Record<string, unknown>; text: string };

/** The reply is of this status and shape. */
async function expectReply(asked: PromiseLike<Reply>, status: number, shape: Shape): Promise<Reply> {
  const reply = await asked;
  expect([reply.status, differences(shape, reply.body)]).toEqual([status, []]);
  return reply;
}

/** As above, and there is something in the page: an empty list fits every shape. */
async function expectPage(agent: Agent, path: string, item: Shape): Promise<void> {
  const { body } = await expectReply(agent.get(path), 200, shapes.page(item));
  expect((body as { items: unknown[] }).items.length).toBeGreaterThan(0);
}

describe('the shape of', () => {
  it('a session', async () => {
    const { email } = world.people.auditor;
    await expectReply(
      supertest(harness.app).post('/api/session').send({ email, password: PASSWORD }),
      200,
      shapes.session,
    );
    await expectReply(world.agents.auditor.get('/api/session'), 200, shapes.session);
    const out = await (await harness.signIn(world.people.auditor)).delete('/api/session');
    expect([out.status, out.text]).toEqual([204, '']);
  });

  it('work orders, batches, records and findings', async () => {
    const { first } = world.agents;
    const { queued, orderId } = world.of.first;
    await expectPage(first, '/api/work-orders', shapes.workOrder);
    await expectReply(first.get(`/api/work-orders/${orderId}`), 200, shapes.workOrder);
    await expectPage(first, '/api/batches', shapes.batch);
    await expectPage(first, '/api/batches?status=submitted', shapes.batch);
    await expectReply(first.get(`/api/batches/${queued.id}`), 200, shapes.batch);
    await expectReply(first.get(`/api/batches/${queued.id}/check`), 200, shapes.check);
    await expectPage(first, `/api/batches/${queued.id}/records`, shapes.record);
    await expectPage(first, `/api/batches/${queued.id}/findings`, shapes.finding);
    await expectPage(world.agents.inspector, `/api/batches/${queued.id}/findings`, shapes.finding);
  });

  it('an upload, its check and handing in', async () => {
    const { first } = world.agents;
    const { orderId, orderNumber } = world.of.first;
    const begun = await expectReply(first.post(`/api/work-orders/${orderId}/batches`), 201, shapes.batch);
    const path = `/api/batches/${(begun.body as { id: string }).id}`;
    const bytes = await workbookFile({
      workOrder: orderNumber,
      set: [setRow('A-spare')],
      pours: pourRows('A-spare', world.shared.lotNumber),
    });
    const workbook = await expectReply(
      first.put(`${path}/workbook`).attach('workbook', bytes, 'batch.xlsx'),
      202,
      shapes.upload,
    );
    const photos = await expectReply(
      first
        .post(`${path}/photos`)
        .attach('photos', await photograph(), 'A-spare kits.jpg')
        .attach('photos', Buffer.from('no picture'), 'notes.txt'),
      202,
      shapes.upload,
    );
    const inputs = [workbook, photos].map((reply) => (reply.body as { input: number }).input);
    expect(inputs).toEqual([1, 2]);
    await harness.drain();
    const check = await expectReply(first.get(`${path}/check`), 200, shapes.check);
    expect(check.body).toMatchObject({ state: 'done', input: 2 });
    await expectReply(first.post(`${path}/submit`), 200, shapes.batch);
    await expectReply(first.post(`${path}/withdraw`), 200, shapes.batch);
  });

  it('a review: taking, deciding, undoing, closing', async () => {
    const { inspector, engineer } = world.agents;
    const { open, concessionAsked } = world.of.first;
    const close = `/api/batches/${open.id}/close-review`;
    const named = await expectReply(inspector.post(close), 409, shapes.problem);
    expect(differences({ undecided: [{ structureNumber: 'string' }] }, named.body)).toEqual([]);

    const path = `/api/findings/${open.findingId}/decision`;
    const reject = {
      decision: 'reject',
      action: 'rework',
      dueOn: '2099-05-11',
      reason: 'Half a foot short.',
    };
    const decided = await expectReply(
      inspector.put(path).set('If-Match', '"0"').send(reject),
      200,
      shapes.finding,
    );
    expect(decided.body).toMatchObject({ decision: reject, version: 1 });
    expect(decided.headers['etag']).toBe('"1"');
    const undone = await expectReply(inspector.delete(path).set('If-Match', '"1"'), 200, shapes.finding);
    expect(undone.body).toMatchObject({ decision: null, version: 2 });
    const stale = await expectReply(
      inspector.put(path).set('If-Match', '"1"').send(reject),
      412,
      shapes.problem,
    );
    expect(differences(shapes.finding, (stale.body as { current: unknown }).current)).toEqual([]);
    await expectReply(inspector.put(path).send(reject), 428, shapes.problem);

    await expectReply(
      engineer.put(`/api/concessions/${concessionAsked}/decision`).set('If-Match', '"1"').send({
        decision: 'grant',
        reason: 'Rock carries it.',
        condition: 'Measure again.',
        endsOn: '2099-09-01',
      }),
      200,
      { id: 'uuid', state: 'granted', version: 'int' },
    );
    const line = `/api/records/${open.recordId}/decision`;
    await expectReply(
      inspector.put(line).set('If-Match', '"0"').send({ decision: 'return', reason: 'Half a foot short.' }),
      200,
      shapes.record,
    );
    await expectReply(inspector.put(path).set('If-Match', '"2"').send(reject), 200, shapes.finding);
    const closed = await expectReply(inspector.post(close), 200, shapes.closed);
    expect(closed.body).toMatchObject({ returned: [open.recordId], held: [], nextRevision: 1 });
  });

  it('the register and a transmittal', async () => {
    const { clerk, auditor } = world.agents;
    const { open, recordNumber } = world.of.first;
    const approved = open.recordIds.filter((id) => id !== open.recordId);
    await expectReply(clerk.post('/api/register/entries').send({ recordIds: approved }), 201, shapes.entries);
    const row = { recordNumber: 'string', version: 'int' };
    await expectPage(auditor, '/api/register', row);
    const versions = await auditor.get(`/api/register/${recordNumber}`);
    expect(differences({ items: [row] }, versions.body)).toEqual([]);
    for (const scope of [
      { workOrder: world.of.first.orderId },
      { recordNumbers: [recordNumber] },
      { filter: { conforming: 'no' } },
    ]) {
      const asked = await expectReply(
        clerk.post('/api/transmittals').send({ scope }),
        202,
        shapes.transmittal,
      );
      expect(asked.body).toMatchObject({ state: 'queued', sha256: null });
    }
    await harness.drain();
    await expectPage(auditor, '/api/transmittals', shapes.transmittal);
    const issued = await expectReply(
      auditor.get(`/api/transmittals/${world.of.first.transmittalId}`),
      200,
      shapes.transmittal,
    );
    expect(differences({ state: 'issued', sha256: 'sha256' }, issued.body)).toEqual([]);
  });

  it('nonconformities under every filter that is named', async () => {
    const { auditor } = world.agents;
    await expectPage(auditor, '/api/nonconformities', shapes.nonconformity);
    const { orderId } = world.of.first;
    const { orgId } = world.people.first;
    // Work day of every line: 2026-04-14, by the rows of the factory.
    const filters = [
      'rule=embedment-short',
      'severity=nonconformity',
      'state=concession-asked',
      'grounds=concession',
      `contractor=${orgId}`,
      `workOrder=${orderId}`,
      'from=2026-04-14&to=2026-04-14',
      `lot=${world.shared.lotNumber}`,
      'product=EP-15',
    ];
    for (const filter of filters)
      await expectPage(auditor, `/api/nonconformities?${filter}`, shapes.nonconformity);
    const other = await auditor.get('/api/nonconformities?from=2026-04-15');
    expect(other.body.items).toEqual([]);
  });

  it('lots, standard, people, trail', async () => {
    const { auditor, administrator } = world.agents;
    await expectPage(auditor, '/api/lots', { id: 'uuid', number: 'string' });
    const versions = await auditor.get('/api/standard/versions');
    expect(differences({ items: [{ n: 'int', effectiveOn: 'day' }] }, versions.body)).toEqual([]);
    await expectPage(administrator, '/api/people', { id: 'uuid', email: 'string', role: 'string' });
    await expectPage(auditor, '/api/trail', { seq: 'int', action: 'string' });
    await expectReply(auditor.get('/api/trail/verify'), 200, { ok: 'boolean', entries: 'int' });
  });

  it('a problem, whatever it is', async () => {
    const { auditor, clerk } = world.agents;
    const nobody = supertest(harness.app);
    const nothing = '00000000-0000-4000-8000-000000000000';
    await expectReply(nobody.get('/api/batches'), 401, shapes.problem);
    await expectReply(auditor.get('/api/people/none'), 404, shapes.problem);
    await expectReply(auditor.get(`/api/batches/${nothing}`), 404, shapes.problem);
    await expectReply(auditor.post('/api/lots').send({}), 403, shapes.problem);
    await expectReply(clerk.post('/api/register/entries').send({ recordIds: 7 }), 400, shapes.problem);
    const page = await expectReply(auditor.get('/api/batches?limit=201'), 400, shapes.problem);
    expect((page.body as { errors: object[] }).errors).toMatchObject([{ pointer: '#/query/limit' }]);
    expect(page.headers['content-type']).toContain('application/problem+json');
  });
});

describe('health', () => {
  it('is answered to anybody', async () => {
    expect((await supertest(harness.app).get('/healthz')).status).toBe(200);
    expect((await supertest(harness.app).get('/readyz')).status).toBe(200);
  });
});

describe('the OpenAPI document', () => {
  it('lists every route, each once, with what it answers, and nothing else', async () => {
    const { body } = await supertest(harness.app).get('/api/openapi.json');
    expect(body.openapi).toMatch(/^3\.1\./);
    const paths = body.paths as Record<string, Record<string, { responses: object }>>;
    const listed = Object.entries(paths).flatMap(([path, methods]) =>
      Object.entries(methods).map(([method, { responses }]): [string, boolean] => [
        `${method} ${path}`,
        Object.keys(responses).some((status) => status.startsWith('2')),
      ]),
    );
    const routes = ROUTES.map(({ method, path }): [string, boolean] => [
      `${method} ${path.replaceAll(/:(\w+)/g, '{$1}')}`,
      true,
    ]);
    expect(new Map(listed)).toEqual(new Map(routes));
  });
});

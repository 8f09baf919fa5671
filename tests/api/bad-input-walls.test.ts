import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { photograph } from '#tests/factories/photograph.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import { buildWorld, type World } from './authorisation/world.ts';

const NOBODY = '00000000-0000-4000-8000-000000000000';
let harness: Harness;
let world: World;
beforeAll(async () => {
  harness = await createHarness();
  world = await buildWorld(harness);
}, 120_000);
afterAll(() => harness?.close());

type Asked = readonly [method: 'get' | 'post' | 'put' | 'delete', path: string, body?: object];

/** What the second contractor may ask for by address; `id` takes an object's id or one that nothing has. */
function asked(id: (own: string) => string): readonly Asked[] {
  const { draft, queued, done, orderId, concessionAsked } = world.of.first;
  const batch = (own: { id: string }, part: string) => `/api/batches/${id(own.id)}${part}`;
  const match = { lineId: NOBODY, view: 'kits' };
  return [
    ['get', batch(queued, '')],
    ['get', batch(queued, '/check')],
    ['get', batch(queued, '/records')],
    ['get', batch(queued, '/findings')],
    ['get', batch(queued, '/photos')],
    ['get', batch(queued, '/inputs')],
    ['get', batch(queued, '/revisions')],
    ['get', batch(queued, '/changes')],
    ['get', `/api/events?subject=batch:${id(queued.id)}`],
    ['get', `/api/events?subject=photos:${id(queued.id)}`],
    ['get', `/api/work-orders/${id(orderId)}`],
    ['get', `/api/work-orders/${id(orderId)}/structures`],
    ['get', `/api/work-orders/${id(orderId)}/template.xlsx`],
    ['get', `/api/records/${id(queued.recordId)}`],
    ['get', `/api/photos/${id(queued.photoId)}/file`],
    ['get', `/api/photos/${id(queued.photoId)}/file?size=original`],
    ['get', `/api/concessions/${id(concessionAsked)}`],
    ['post', `/api/work-orders/${id(orderId)}/batches`],
    ['post', batch(draft, '/submit')],
    ['post', batch(draft, '/recheck')],
    ['post', batch(queued, '/withdraw')],
    ['put', `/api/photos/${id(queued.photoId)}/match`, match],
    ['delete', `/api/photos/${id(queued.photoId)}/match`],
    ['put', `/api/findings/${id(done.findingId)}/answer`, { text: 'Ours.' }],
  ];
}

async function answerTo(agent: Agent, [method, path, body]: Asked): Promise<object> {
  const request = agent[method](path);
  const reply = await (body ? request.send(body) : request);
  const { status, headers, text } = reply;
  return { status, text, length: headers['content-length'], etag: headers['etag'] };
}

describe('what is another contractor’s, asked for by its address', () => {
  it('is answered to the letter as what is not there: nothing tells the two apart', async () => {
    const agent = world.agents.second;
    const [theirs, absent] = [asked((own) => own), asked(() => NOBODY)];
    for (const [at, one] of theirs.entries()) {
      const [foreign, nothing] = [await answerTo(agent, one), await answerTo(agent, absent[at] as Asked)];
      expect([one[0], one[1], foreign]).toEqual([one[0], one[1], nothing]);
      expect([one[1], foreign]).toEqual([one[1], expect.objectContaining({ status: 404 })]);
    }
  });

  it('is there for its own', async () => {
    const reads = asked((own) => own).filter(
      ([method, path]) => method === 'get' && !path.includes('/events'),
    );
    for (const one of reads)
      expect([one[1], await answerTo(world.agents.first, one)]).toEqual([
        one[1],
        expect.objectContaining({ status: 200 }),
      ]);
  });

  it('takes no file, keeps none of it, and says no more of one that is there than of one that is not', async () => {
    const { draft } = world.of.first;
    const before = await world.agents.first.get(`/api/batches/${draft.id}`);
    const picture = await photograph();
    const told: object[] = [];
    for (const id of [draft.id, NOBODY])
      for (const [method, part, field] of [
        ['post', 'photos', 'photos'],
        ['put', 'workbook', 'workbook'],
      ] as const) {
        const reply = await world.agents.second[method](`/api/batches/${id}/${part}`)
          .set('Idempotency-Key', `wall-${part}`)
          .attach(field, picture, 'a.jpg');
        told.push({ status: reply.status, text: reply.text });
      }
    expect(told.slice(0, 2)).toEqual(told.slice(2));
    expect(told.map((one) => (one as { status: number }).status)).toEqual([404, 404, 404, 404]);
    expect((await world.agents.first.get(`/api/batches/${draft.id}`)).body).toEqual(before.body);
  });
});

describe('a review that goes on', () => {
  it('tells its contractor nothing of how many lines are decided, until it is closed', async () => {
    const { open, done } = world.of.first;
    const decided = async (agent: Agent, id: string): Promise<[string, number]> => {
      const { body } = await agent.get(`/api/batches/${id}`);
      return [body.status, body.counts.decided];
    };
    // The world's open batch has two lines, and a concession is asked for on one: that one is held.
    expect(await decided(world.agents.inspector, open.id)).toEqual(['in-review', 1]);
    expect(await decided(world.agents.first, open.id)).toEqual(['in-review', 0]);
    const list = await world.agents.first.get('/api/batches?status=in-review');
    expect(list.body.items.map((one: { counts: { decided: number } }) => one.counts.decided)).toEqual([0]);
    expect((await decided(world.agents.first, done.id))[1]).toBe(2);
  });
});

import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import type { OwnObjects } from './authorisation/own-objects.ts';
import { buildWorld, type World } from './authorisation/world.ts';

type Side = 'first' | 'second';
const OTHER = { first: 'second', second: 'first' } as const;
const SIDES = ['first', 'second'] as const;

let harness: Harness;
let world: World;
beforeAll(async () => {
  harness = await createHarness();
  world = await buildWorld(harness);
}, 180_000);
afterAll(() => harness?.close());

/** Every id, number and name that belongs to one contractor. The shared order of planned structures is not among them. */
function marksOf(side: Side): string[] {
  const texts = (value: unknown): string[] =>
    typeof value === 'string' ? [value] : Object.values(value as object).flatMap(texts);
  const { id, email, name, orgId, orgName } = world.people[side];
  // The number of an order is two digits, which stand in many a figure.
  const objects: Partial<OwnObjects> = {
    ...world.of[side],
    orderNumber: `Line work ${world.of[side].orderNumber}`,
  };
  return [...texts(objects), id, email, name, orgId, orgName];
}

/** Stands the mark in the text as a word of its own? A number like 18-02 may also turn up inside some id. */
function names(text: string, mark: string): boolean {
  const literal = mark.replaceAll(/[.*+?^${}()|[\]\\]/g, String.raw`\$&`);
  return new RegExp(`(?<![\\w-])${literal}(?![\\w-])`).test(text);
}

/** Every list, and every thing, that a contractor may read of their own. */
function readable(own: OwnObjects): string[] {
  const batches = [own.draft, own.queued, own.open, own.done];
  const parts = ['', '/check', '/inputs', '/revisions', '/changes', '/photos', '/records', '/findings'];
  return [
    '/api/session',
    '/api/home',
    '/api/work-orders',
    `/api/work-orders/${own.orderId}`,
    `/api/work-orders/${own.orderId}/structures`,
    '/api/batches',
    '/api/batches?status=draft&status=checked&status=in-review',
    ...batches.flatMap((batch) => parts.map((part) => `/api/batches/${batch.id}${part}`)),
    ...batches.map((batch) => `/api/records/${batch.recordId}`),
    '/api/concessions',
    `/api/concessions/${own.concessionAsked}`,
    '/api/register',
    '/api/register?versions=all',
    `/api/register/${own.recordNumber}`,
    `/api/sheets/${own.sheetFileId}`,
    `/api/work-orders/${own.orderId}/check-context`,
    '/api/products',
    '/api/standard/versions',
  ];
}

async function textOf(agent: Agent, path: string): Promise<string> {
  const reply = await agent.get(path);
  return `${path} ${reply.status} ${reply.text}`;
}

describe.each(SIDES)('what the %s contractor is told', (side) => {
  it('names nothing of the other, in any list or thing they may read', async () => {
    const strange = marksOf(OTHER[side]);
    const leaks: string[] = [];
    for (const path of readable(world.of[side])) {
      const text = await textOf(world.agents[side], path);
      leaks.push(...strange.filter((mark) => names(text, mark)).map((mark) => `${path}: ${mark}`));
    }
    expect(leaks).toEqual([]);
  });

  it('does name their own, so that the silence means something', async () => {
    const all: string[] = [];
    for (const path of readable(world.of[side])) all.push(await textOf(world.agents[side], path));
    const told = all.join('\n');
    const own = world.of[side];
    const missing = marksOf(side).filter((mark) => !names(told, mark));
    // A transmittal is the owner's; contractors are not told of it.
    expect(missing).toEqual([own.transmittalId]);
  });

  it('counts only their own', async () => {
    const agent = world.agents[side];
    const total = async (path: string): Promise<unknown> => (await agent.get(path)).body.total;
    expect(await total('/api/batches')).toBe(4);
    expect(await total('/api/work-orders')).toBe(1);
    expect(await total('/api/register')).toBe(2);
    expect((await agent.get('/api/concessions')).body.items).toHaveLength(2);
  });

  it('is the same whether a filter names the other contractor or nobody', async () => {
    const agent = world.agents[side];
    const strange = world.people[OTHER[side]].orgId;
    const nobody = '00000000-0000-4000-8000-000000000000';
    for (const path of ['/api/batches?contractor=', '/api/register?contractor=']) {
      const [asked, none] = [await agent.get(`${path}${strange}`), await agent.get(`${path}${nobody}`)];
      expect(asked.body).toEqual(none.body);
    }
    const orders = [world.of[OTHER[side]].orderId, nobody];
    const [asked, none] = await Promise.all(
      orders.map((order) => agent.get(`/api/batches?workOrder=${order}`)),
    );
    expect(asked?.body).toEqual(none?.body);
  });
});

describe.each(SIDES)('the search of the %s contractor', (side) => {
  const found = async (agent: Agent, q: string): Promise<{ label: string; detail: string }[]> =>
    (await agent.get(`/api/search?q=${encodeURIComponent(q)}`)).body.items;
  const numbersOf = (of: Side): string[] => {
    const own = world.of[of];
    const batches = [own.draft, own.queued, own.open, own.done];
    return [
      ...batches.map((batch) => batch.number),
      own.done.structures[0] ?? '',
      own.recordNumber,
      own.orderNumber,
    ];
  };

  it('finds their own by number, and by the other’s numbers nothing', async () => {
    for (const number of numbersOf(side))
      expect([number, (await found(world.agents[side], number)).length]).not.toEqual([number, 0]);
    for (const number of numbersOf(OTHER[side]))
      expect([number, await found(world.agents[side], number)]).toEqual([number, []]);
    expect(await found(world.agents[side], world.shared.lotNumber)).toEqual([]);
    expect(await found(world.agents[side], 'T-')).toEqual([]);
  });

  it('tells nothing of a review that is going on', async () => {
    const held = world.of[side].open.structures[1] ?? '';
    const [line] = await found(world.agents[side], held);
    expect(line?.label).toBe(held);
    expect(line?.detail).not.toContain('held');
    const [seen] = await found(world.agents.inspector, held);
    expect(seen?.detail).toContain('held');
  });
});

describe('a foreign thing and a thing that is not there', () => {
  it('are refused in the same words', async () => {
    const agent = world.agents.second;
    const { queued, orderId, concessionAsked, recordNumber } = world.of.first;
    const nobody = '00000000-0000-4000-8000-000000000000';
    const pairs = [
      [`/api/batches/${queued.id}`, `/api/batches/${nobody}`],
      [`/api/batches/${queued.id}/findings`, `/api/batches/${nobody}/findings`],
      [`/api/records/${queued.recordId}`, `/api/records/${nobody}`],
      [`/api/photos/${queued.photoId}/file`, `/api/photos/${nobody}/file`],
      [`/api/work-orders/${orderId}`, `/api/work-orders/${nobody}`],
      [`/api/concessions/${concessionAsked}`, `/api/concessions/${nobody}`],
      [`/api/register/${recordNumber}`, '/api/register/R-999999'],
    ] as const;
    for (const [foreign, absent] of pairs) {
      const [one, other] = [await agent.get(foreign), await agent.get(absent)];
      expect([foreign, one.status]).toEqual([foreign, 404]);
      expect(one.body).toEqual(other.body);
    }
  });
});

describe('the same bytes handed in by both', () => {
  const upload = (agent: Agent, batchId: string, files: readonly (readonly [Buffer, string])[]) => {
    const form = agent.post(`/api/batches/${batchId}/photos`);
    for (const [bytes, name] of files) form.attach('photos', bytes, name);
    return form;
  };

  it('are answered as bytes that nobody has handed in', async () => {
    const [shared, fresh] = [await photograph(), await photograph()];
    const { first, second } = world.of;
    const before = await upload(world.agents.first, first.draft.id, [[shared, 'theirs.jpg']]);
    expect(before.status).toBe(202);
    const reply = await upload(world.agents.second, second.draft.id, [
      [shared, 'a.jpg'],
      [fresh, 'b.jpg'],
    ]);
    const sha = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');
    const [same, other] = reply.body.files;
    expect(same).toEqual({
      id: expect.any(String),
      fileName: 'a.jpg',
      sha256: sha(shared),
      already: null,
      error: null,
    });
    expect(other).toEqual({
      id: expect.any(String),
      fileName: 'b.jpg',
      sha256: sha(fresh),
      already: null,
      error: null,
    });
    expect(Object.keys(reply.body)).toEqual(['input', 'files']);
    expect(reply.headers['idempotency-replayed']).toBeUndefined();
    const theirs = before.body.files[0].id as string;
    expect(same.id).not.toBe(theirs);
    await harness.drain();
    expect((await world.agents.second.get(`/api/photos/${same.id}/file`)).status).toBe(200);
    expect((await world.agents.second.get(`/api/photos/${theirs}/file`)).status).toBe(404);
    expect(await textOf(world.agents.second, `/api/batches/${second.draft.id}/photos`)).not.toContain(
      'theirs.jpg',
    );
  });

  it('make a workbook of the other order no less a workbook, and tell nothing of that order', async () => {
    const { second } = world.of;
    const structure = world.of.first.done.structures[0] ?? '';
    const bytes = await workbookFile({
      workOrder: world.of.first.orderNumber,
      contractor: 'Whoever',
      set: [setRow(structure)],
      pours: pourRows(structure, world.shared.lotNumber),
    });
    const path = `/api/batches/${second.draft.id}`;
    const reply = await world.agents.second.put(`${path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
    expect(reply.status).toBe(202);
    await harness.drain();
    expect((await world.agents.second.get(`${path}/check`)).body.state).toBe('done');
    const told = await textOf(world.agents.second, `${path}/findings`);
    expect(told).toContain('not-on-order');
    // What they wrote themselves comes back; nothing that they did not.
    const known = [structure];
    const leaks = marksOf('first').filter((mark) => !known.includes(mark) && names(told, mark));
    expect(leaks).toEqual([]);
  });
});

describe('what a finding says to the owner alone', () => {
  it('reaches the inspector and not the contractor', async () => {
    const { done } = world.of.first;
    const secret = `batch ${world.of.second.done.number} of ${world.people.second.orgName}`;
    await run(
      harness.em(),
      `insert into findings (run_id, revision_id, record_id, line_id, ordinal, code, severity, kind, structure_number,
         params, owner_params, fingerprint, origin)
       select f.run_id, f.revision_id, f.record_id, f.line_id, 900, 'photo-missing', 'query', f.kind, f.structure_number,
         '{"view": "kits"}', jsonb_build_object('other', $2::text), 'planted', 'after-acceptance'
       from findings f where f.id = $1`,
      [done.findingId, secret],
    );
    const planted = async (agent: Agent): Promise<{ params: object } | undefined> => {
      const { body } = await agent.get(`/api/batches/${done.id}/findings`);
      return body.items.find((one: { code: string }) => one.code === 'photo-missing');
    };
    expect((await planted(world.agents.inspector))?.params).toEqual({ view: 'kits', other: secret });
    expect((await planted(world.agents.first))?.params).toEqual({ view: 'kits' });
    const sheet = done.recordIds.map((id) => `/api/records/${id}`);
    for (const path of [...sheet, '/api/concessions', '/api/register', `/api/batches/${done.id}/changes`])
      expect(await textOf(world.agents.first, path)).not.toContain(secret);
  });
});

describe('a draft', () => {
  it('shows the owner’s people that it is there and nothing that is in it', async () => {
    const { draft } = world.of.first;
    for (const who of ['inspector', 'engineer', 'clerk', 'auditor', 'administrator'] as const) {
      const agent = world.agents[who];
      for (const part of ['records', 'findings', 'photos', 'inputs'])
        expect([who, part, (await agent.get(`/api/batches/${draft.id}/${part}`)).body.items]).toEqual([
          who,
          part,
          [],
        ]);
      const shown = await agent.get(`/api/batches/${draft.id}`);
      expect(Object.values(shown.body.counts).filter((count) => count !== 0)).toEqual([]);
    }
  });
});

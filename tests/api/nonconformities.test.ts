import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createLot } from '#tests/factories/foam.ts';
import { handIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let auditor: Agent;
let one: WorkSite;
let other: WorkSite;

/** Set half a foot short of the 6 ft that a 40 ft pole is due: of each line one finding is looked at here. */
const short = (name: string) => setRow(name, { embedmentFt: 5.5 });

beforeAll(async () => {
  harness = await createHarness();
  one = await createWorkSite(harness, { planned: ['N-1', 'N-2', 'N-10'] });
  const contractor = await harness.person('contractor');
  other = {
    ...one,
    contractor,
    order: await createWorkOrder(harness.em(), {
      contractorId: contractor.orgId,
      planned: [{ structureNumber: 'M-1' }],
    }),
    lot: await createLot(harness.em(), { productId: one.product.id }),
  };
  const first = await handIn(harness, {
    site: one,
    agent: await harness.signIn(one.contractor),
    set: ['N-1', 'N-2', 'N-10'].map(short),
  });
  await handIn(harness, { site: other, agent: await harness.signIn(contractor), set: [short('M-1')] });
  const inspector = await harness.signIn('inspector');
  await inspector.post(`/api/batches/${first.id}/take`).expect(200);
  const found = await inspector.get(`/api/batches/${first.id}/findings`);
  const idOf = (structure: string): string =>
    found.body.items.find(
      (item: { code: string; structureNumber: string }) =>
        item.code === 'embedment-short' && item.structureNumber === structure,
    ).id;
  await inspector
    .put(`/api/findings/${idOf('N-1')}/decision`)
    .set('If-Match', '"0"')
    .send({ decision: 'reject', action: 'rework', dueOn: '2099-05-11', reason: 'Half a foot short.' })
    .expect(200);
  const asked = await inspector
    .post(`/api/findings/${idOf('N-2')}/concession`)
    .send({ reason: 'Rock at 5.5 ft.' });
  if (!asked.ok) throw new Error(asked.text);
  auditor = await harness.signIn('auditor');
}, 120_000);
afterAll(() => harness.close());

/** The structures found short under a filter, in the order of their names. */
async function listed(filter: Readonly<Record<string, string>>): Promise<string[]> {
  const query = new URLSearchParams({ rule: 'embedment-short', ...filter });
  const reply = await auditor.get(`/api/nonconformities?${query}`).expect(200);
  expect(reply.body.total).toBe(reply.body.items.length);
  return reply.body.items.map((item: { structureNumber: string }) => item.structureNumber).toSorted();
}

describe('the list of nonconformities', () => {
  it('has what does not conform, of every contractor', async () => {
    expect(await listed({})).toEqual(['M-1', 'N-1', 'N-10', 'N-2']);
  });

  it('filters by rule', async () => {
    expect(await listed({ rule: 'embedment-short' })).toHaveLength(4);
    expect(await listed({ rule: 'lean-left' })).toEqual([]);
  });

  it('filters by severity', async () => {
    expect(await listed({ severity: 'nonconformity' })).toHaveLength(4);
    expect(await listed({ severity: 'query' })).toEqual([]);
    expect(await listed({ severity: 'note' })).toEqual([]);
  });

  it.each([
    ['undecided', ['M-1', 'N-10']],
    ['rejected', ['N-1']],
    ['concession-asked', ['N-2']],
    ['approved', []],
  ])('filters by state: %s', async (state, structures) => {
    expect(await listed({ state })).toEqual(structures);
  });

  it('has none by concession before one is granted', async () => {
    expect(await listed({ grounds: 'concession' })).toEqual([]);
  });

  it('filters by contractor and by work order', async () => {
    expect(await listed({ contractor: one.contractor.orgId })).toEqual(['N-1', 'N-10', 'N-2']);
    expect(await listed({ contractor: other.contractor.orgId })).toEqual(['M-1']);
    expect(await listed({ workOrder: other.order.id })).toEqual(['M-1']);
    expect(await listed({ workOrder: one.order.id, contractor: other.contractor.orgId })).toEqual([]);
  });

  it('filters by work day, both ends included', async () => {
    // The rows of the factory say 14 April 2026.
    expect(await listed({ from: '2026-04-14', to: '2026-04-14' })).toHaveLength(4);
    expect(await listed({ from: '2026-04-15' })).toEqual([]);
    expect(await listed({ to: '2026-04-13' })).toEqual([]);
  });

  it('filters by lot and by product', async () => {
    expect(await listed({ lot: one.lot.number })).toEqual(['N-1', 'N-10', 'N-2']);
    expect(await listed({ lot: other.lot.number })).toEqual(['M-1']);
    expect(await listed({ product: one.product.code })).toHaveLength(4);
    expect(await listed({ product: 'NONE-1' })).toEqual([]);
  });

  it('filters by the beginning of a structure number, whatever its case, and takes signs for what they are', async () => {
    expect(await listed({ q: 'n-1' })).toEqual(['N-1', 'N-10']);
    expect(await listed({ q: 'M' })).toEqual(['M-1']);
    expect(await listed({ q: '-1' })).toEqual([]);
    expect(await listed({ q: '%' })).toEqual([]);
    expect(await listed({ q: 'N_1' })).toEqual([]);
  });

  it('goes on page by page without losing or repeating any', async () => {
    const seen: string[] = [];
    for (let cursor: string | null = ''; cursor !== null;) {
      const reply = await auditor
        .get(`/api/nonconformities?rule=embedment-short&limit=1${cursor === '' ? '' : `&cursor=${cursor}`}`)
        .expect(200);
      expect(reply.body.items).toHaveLength(1);
      seen.push(reply.body.items[0].structureNumber);
      cursor = reply.body.nextCursor as string | null;
    }
    expect(seen.toSorted()).toEqual(['M-1', 'N-1', 'N-10', 'N-2']);
  });
});

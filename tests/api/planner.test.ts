import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { setRow } from '#tests/factories/set-row.ts';
import { handIn } from '#tests/factories/hand-in.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let administrator: Agent;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['P-1'] });
  administrator = await harness.signIn('administrator');
});
afterAll(() => harness.close());

const stock = async (product?: string) => {
  const reply = await administrator.get('/api/planner/stock').query(product === undefined ? {} : { product });
  expect(reply.status).toBe(200);
  return reply.body.items as { number: string; status: string; sizes: { kitFt3: number; left: number }[] }[];
};
const left = (lots: Awaited<ReturnType<typeof stock>>, number: string, kitFt3: number) =>
  lots.find((lot) => lot.number === number)?.sizes.find((size) => size.kitFt3 === kitFt3)?.left;

describe('stock to plan from', () => {
  it('is received less used, by lot and size', async () => {
    // The factory's lot: 100 kits of 4 ft³ and 1,000 of each other size.
    expect(left(await stock(site.product.code), site.lot.number, 4)).toBe(100);
    const agent = await harness.signIn(site.contractor);
    await handIn(harness, { site, agent, set: [setRow('P-1')] });
    // The pour of the factory: one kit of 8 and one of 1.5 ft³.
    const after = await stock(site.product.code);
    expect([8, 4, 1.5].map((kit) => left(after, site.lot.number, kit))).toEqual([999, 100, 999]);
  });

  it('is of one product, or of all', async () => {
    expect(await stock('no such foam')).toEqual([]);
    expect((await stock()).map(({ number }) => number)).toContain(site.lot.number);
  });
});

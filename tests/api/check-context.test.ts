import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { placeOf } from '#tests/factories/place.ts';
import { createOnRecord } from '#tests/pipeline/on-record.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import type { CheckContextData } from '#shared/generated/api-types.ts';

let harness: Harness;
let site: WorkSite;
let agent: Agent;
beforeAll(async () => {
  harness = await createHarness();
  const own = await harness.person('contractor');
  await createOnRecord(harness, { structureNumber: 'C-1', ...placeOf('C-1'), contractorId: own.orgId });
  await createOnRecord(harness, { structureNumber: 'C-2', ...placeOf('C-2') });
  site = await createWorkSite(harness, { contractor: own, planned: ['C-3'] });
  // Both stand already; this order means to replace them.
  await run(
    harness.em(),
    `insert into planned (work_order_id, structure_id, kind, design)
     select $1, s.id, 'set', p.design from planned p join structures s on s.id = p.structure_id
     where s.number in ('C-1', 'C-2')`,
    [site.order.id],
  );
  agent = await harness.signIn(own);
});
afterAll(() => harness.close());

const read = async (who: Agent): Promise<CheckContextData> => {
  const reply = await who.get(`/api/work-orders/${site.order.id}/check-context`);
  expect(reply.status).toBe(200);
  return reply.body as CheckContextData;
};

describe('what a workbook is checked against before it is handed in', () => {
  it('is the published standard, the products, the lots and the design list', async () => {
    const context = await read(agent);
    expect(context.workOrder).toEqual({ id: site.order.id, number: site.order.number });
    expect(context.zone).toBe('America/Chicago');
    expect(context.standards).toHaveLength(1);
    expect(context.products.map(({ code }) => code)).toEqual([site.product.code]);
    expect(context.lots).toMatchObject([
      { product: site.product.code, number: site.lot.number, status: 'in-use', history: [] },
    ]);
    expect(context.design.map(({ structureNumber }) => structureNumber).toSorted()).toEqual([
      'C-1',
      'C-2',
      'C-3',
    ]);
    expect(context.area).toBeNull();
  });

  it('knows the contractor’s own structures on record and nobody else’s, whoever asks', async () => {
    for (const who of [agent, await harness.signIn('inspector')]) {
      const context = await read(who);
      expect(context.register).toEqual([{ structureKey: 'C-1', recordNumber: 'R-C-1' }]);
      expect(context.neighbours.map(({ structureNumber }) => structureNumber)).toEqual(['C-1']);
      expect(JSON.stringify([context.register, context.neighbours])).not.toContain('C-2');
    }
  });

  it('tells nothing of how many kits of a lot were received or used', async () => {
    const { lots } = await read(agent);
    expect(lots.flatMap((lot) => Object.keys(lot)).toSorted()).toEqual([
      'expiresOn',
      'history',
      'number',
      'product',
      'status',
    ]);
  });
});

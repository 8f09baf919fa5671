import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'], number: '17' });
  contractor = await harness.signIn(site.contractor);
});
afterAll(() => harness.close());

describe('a batch handed in', () => {
  it('goes from draft to submitted, checked on the way', async () => {
    const created = await contractor.post(`/api/work-orders/${site.order.id}/batches`);
    expect(created.status).toBe(201);
    expect(created.body).toMatchObject({ number: '17-01', status: 'draft', input: 0, can: ['upload'] });
    const batch = `/api/batches/${created.body.id}`;

    const workbook = await workbookFile({
      workOrder: site.order.number,
      set: [setRow('L-1'), setRow('L-2', { embedmentFt: 5.5 })],
      pours: [...pourRows('L-1', site.lot.number), ...pourRows('L-2', site.lot.number)],
    });
    const put = await contractor.put(`${batch}/workbook`).attach('workbook', workbook, 'batch.xlsx');
    expect(put.body).toMatchObject({ input: 1, files: [{ fileName: 'batch.xlsx', error: null }] });
    expect(put.status).toBe(202);

    const upload = contractor.post(`${batch}/photos`);
    for (const view of SET_VIEWS)
      for (const number of ['L-1', 'L-2'])
        upload.attach('photos', await photograph(), `${number} ${view}.jpg`);
    const photos = await upload;
    expect(photos.status).toBe(202);
    expect(photos.body.input).toBe(2);

    await harness.drain();
    const check = await contractor.get(`${batch}/check`);
    expect(check.body).toEqual({ input: 2, state: 'done', stage: null, done: 2, total: 2, problem: null });

    const records = await contractor.get(`${batch}/records`);
    expect(records.body.items.map((one: { structureNumber: string }) => one.structureNumber)).toEqual([
      'L-1',
      'L-2',
    ]);
    expect(records.body.items[0].derived.voidFt3).toBeCloseTo(8.6701, 3);
    expect(records.body.items[0].photos).toHaveLength(4);

    const findings = await contractor.get(`${batch}/findings`);
    expect(
      findings.body.items.map((one: { code: string; structureNumber: string; margin: number }) => [
        one.code,
        one.structureNumber,
        one.margin,
      ]),
    ).toEqual([['embedment-short', 'L-2', -0.5]]);

    const submitted = await contractor.post(`${batch}/submit`);
    expect(submitted.body).toMatchObject({ status: 'submitted', can: ['withdraw'] });
  });
});

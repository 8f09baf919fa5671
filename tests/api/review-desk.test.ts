import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Concession, FindingRow, RecordRow, RecordSheetData } from '#shared/generated/api-types.ts';
import { uploadLines, type HandedIn } from '#tests/factories/hand-in.ts';
import { pourRow, pourRows, setRow } from '#tests/factories/set-row.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let inspector: Agent;
let batch: HandedIn;

/** Two lines, the second 0.5 ft short of the 6.0 ft due, and a pour that belongs to neither. */
beforeAll(async () => {
  harness = await createHarness();
  const site = await createWorkSite(harness, { planned: ['L-1', 'L-2'], number: '17' });
  const contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
  batch = (await contractor.post(`/api/work-orders/${site.order.id}/batches`)).body as HandedIn;
  const set = [setRow('L-1'), setRow('L-2', { embedmentFt: 5.5 })];
  await uploadLines(harness, { site, agent: contractor, set, batchId: batch.id });
  const lot = site.lot.number;
  const workbook = await workbookFile({
    workOrder: site.order.number,
    contractor: site.contractor.orgName,
    set,
    pours: [...pourRows('L-1', lot), ...pourRows('L-2', lot), pourRow('L-9', lot)],
  });
  await contractor.put(`/api/batches/${batch.id}/workbook`).attach('workbook', workbook, 'batch.xlsx');
  await harness.drain();
  const submitted = await contractor.post(`/api/batches/${batch.id}/submit`);
  if (submitted.status !== 200) throw new Error(submitted.text);
  await inspector.post(`/api/batches/${batch.id}/take`);
});
afterAll(() => harness.close());

const lines = async (): Promise<RecordRow[]> =>
  (await inspector.get(`/api/batches/${batch.id}/records`)).body.items;
const sheetOf = async (structureNumber: string): Promise<RecordSheetData> => {
  const line = (await lines()).find((one) => one.structureNumber === structureNumber);
  return (await inspector.get(`/api/records/${line?.id}`)).body;
};

describe('what the desk shows', () => {
  it('the title block as it stands on a drawing', async () => {
    const { titleBlock } = await sheetOf('L-2');
    expect(titleBlock).toMatchObject({
      workOrder: '17',
      structure: 'L-2',
      kind: 'Set, soil',
      pole: '40 ft class 4, pine',
      measuredOn: '2026-04-14T09:40',
      revision: '0',
      decided: 'not yet',
      sheet: '2 of 2',
    });
  });

  it('findings that belong to no line, apart', async () => {
    const all = await inspector.get(`/api/batches/${batch.id}/findings`);
    const apart = await inspector.get(`/api/batches/${batch.id}/findings?withoutLine=true`);
    expect(all.body.items.length).toBeGreaterThan(1);
    expect(apart.body.items).toMatchObject([
      { code: 'pour-orphan', recordId: null, can: ['decide', 'ask-concession'] },
    ]);
    expect(apart.body.total).toBe(1);
  });
});

describe('what the desk does', () => {
  it('asks for a concession with its figures, and takes the question back', async () => {
    const finding = (await sheetOf('L-2')).findings.find((one) => one.code === 'embedment-short');
    const asked = await inspector.post(`/api/findings/${finding?.id}/concession`).send({ reason: 'Rock.' });
    const concession: Concession = asked.body;
    // 5.5 ft set where 6.0 ft is due.
    expect(concession.findings).toMatchObject([{ measured: 5.5, limit: 6, margin: -0.5, unit: 'ft' }]);
    const held: FindingRow | undefined = (await sheetOf('L-2')).findings.find(
      (one) => one.id === finding?.id,
    );
    expect(held).toMatchObject({ state: 'concession-asked', can: ['undo'] });
    await inspector.delete(`/api/findings/${finding?.id}/decision`).set('If-Match', `"${held?.version}"`);
    expect((await sheetOf('L-2')).record.state).toBe('undecided');
    const seen = await inspector.get(`/api/concessions/${concession.id}`);
    expect(seen.body.state).toBe('withdrawn');
  });

  it('names the records that keep a review open', async () => {
    const refused = await inspector.post(`/api/batches/${batch.id}/close-review`);
    const ids = (await lines()).map((line) => line.id);
    expect(refused.status).toBe(409);
    expect(refused.body.undecided.map((one: { recordId: string }) => one.recordId)).toEqual(ids);
  });
});

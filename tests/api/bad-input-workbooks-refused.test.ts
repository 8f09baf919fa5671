import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { findingsOf, type HandedIn, recordsOf, startBatch } from '#tests/factories/start-batch.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { REFUSED_FILES } from '#tests/fixtures/workbooks/refused-files.ts';
import { type Agent, createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let contractor: Agent;
let batch: HandedIn;
let good: Buffer;
/** What the batch showed when its one good workbook was checked. */
let first: Awaited<ReturnType<typeof standing>>;

const put = (bytes: Buffer) =>
  contractor.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');

/** What the batch shows of its uploads and of what was found in them. */
async function standing() {
  const { body } = await contractor.get(`${batch.path}/inputs`);
  const inputs = body.items as { n: number; sha256: string }[];
  return {
    inputs: inputs.map(({ n, sha256 }) => ({ n, sha256 })),
    records: await recordsOf(contractor, batch),
    findings: await findingsOf(contractor, batch),
  };
}

beforeAll(async () => {
  harness = await createHarness();
  const site = await createWorkSite(harness, { planned: ['L-1'] });
  contractor = await harness.signIn(site.contractor);
  batch = await startBatch(contractor, site);
  good = await workbookFile({
    workOrder: site.order.number,
    // 5 ft where 6.0 ft are due: something to find.
    set: [setRow('L-1', { embedmentFt: 5 })],
    pours: pourRows('L-1', site.lot.number),
  });
  await put(good);
  await harness.drain();
  first = await standing();
});
afterAll(() => harness.close());

describe('a file that is not taken at all', () => {
  it.each([
    ['of 0 bytes', Buffer.alloc(0), 422, 'upload.empty', /file is empty\. Choose the workbook again/u],
    [
      'of 60 MB',
      Buffer.alloc(60_000_000, 'x'),
      413,
      'upload.too-large',
      /larger than 50 MB\. Remove pictures/u,
    ],
  ])('%s leaves upload and check as they were', async (_, bytes, status, code, says) => {
    expect((await put(bytes)).body).toMatchObject({ status, code, detail: expect.stringMatching(says) });
    await harness.drain();
    expect(await standing()).toEqual(first);
    expect((await contractor.get(batch.path)).body).toMatchObject({ status: 'checked', input: 1 });
  });
});

// All in one batch, one after the other: what stood before the first of them stands after the last.
describe('a file that is refused', () => {
  it.each(REFUSED_FILES)('$name: says why, where and what to do, and loses nothing', async (file) => {
    const before = await standing();
    const reply = await put(file.bytes(good));
    expect(reply.status).toBe(202);
    await harness.drain();

    const { body } = await contractor.get(`${batch.path}/check`);
    expect(body).toMatchObject({
      input: reply.body.input,
      state: 'failed',
      problem: { code: `workbook.${file.code}` },
    });
    expect(body.problem.detail).toMatch(file.place);
    expect(body.problem.detail).toMatch(file.remedy);

    const now = await standing();
    expect(now.inputs.slice(1)).toEqual(before.inputs);
    expect(now.records).toEqual(first.records);
    expect(now.findings).toEqual(first.findings);
    expect((await contractor.get(batch.path)).body).toMatchObject({
      status: 'draft',
      counts: { lines: 1 },
      can: expect.arrayContaining(['upload']),
    });
  });

  it('gives way to the workbook that stood before, which is checked as it was', async () => {
    expect(first.findings.map((one) => one.code)).toContain('embedment-short');
    // The good one, each file that was refused, and the good one again.
    expect((await put(good)).body.input).toBe(REFUSED_FILES.length + 2);
    await harness.drain();
    expect((await contractor.get(batch.path)).body.status).toBe('checked');
    const codes = (await findingsOf(contractor, batch)).map((one) => one.code);
    expect(codes).toEqual(first.findings.map((one) => one.code));
  });
});

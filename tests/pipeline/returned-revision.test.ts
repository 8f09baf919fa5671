import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { pourRow, pourRows, setRow } from '#tests/factories/set-row.ts';
import {
  findingsOf,
  recordsOf,
  startBatch,
  uploadPhotographs,
  uploadWorkbook,
  type HandedIn,
} from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let inspector: Agent;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
});
afterAll(() => harness.close());

const VIEWS = ['bore-depth', 'kits', 'finish', 'plumb'];
const lines = (second = {}) => ({
  set: [setRow('L-1', { embedmentFt: 5.9 }), setRow('L-2', second)],
  pours: [...pourRows('L-1', site.lot.number), ...pourRows('L-2', site.lot.number)],
});

const decide = async (finding: FindingRow, body: object) => {
  const reply = await inspector
    .put(`/api/findings/${finding.id}/decision`)
    .set('If-Match', `"${finding.version}"`)
    .send(body);
  if (reply.status !== 200) throw new Error(reply.text);
};

/** L-1 too shallow, approved on evidence; L-2 with its first work unproved, which is sent back. */
async function returnedBatch(): Promise<HandedIn> {
  const batch = await startBatch(contractor, site);
  await uploadPhotographs(
    contractor,
    batch,
    VIEWS.flatMap((view) => [`L-1 ${view}.jpg`, `L-2 ${view}.jpg`]),
  );
  await uploadWorkbook(harness, contractor, { batch, site, workbook: lines({ hardwareAt: null }) });
  await contractor.post(`${batch.path}/submit`);
  await inspector.post(`${batch.path}/take`);
  const found = await findingsOf(inspector, batch);
  expect(found.map((one) => [one.code, one.structureNumber])).toEqual([
    ['embedment-short', 'L-1'],
    ['unproved', 'L-2'],
  ]);
  const [short, unproved] = found as [FindingRow, FindingRow];
  await decide(short, {
    decision: 'approve',
    grounds: 'evidence',
    reason: 'Measured again in the field: 6.0 ft.',
  });
  await decide(unproved, {
    decision: 'reject',
    action: 'correct',
    dueOn: '2099-01-31',
    reason: 'Say when it was framed.',
  });
  // A review that goes on is not told to the contractor.
  expect((await recordsOf(contractor, batch)).map((line) => line.state)).toEqual(['undecided', 'undecided']);
  const closed = await inspector.post(`${batch.path}/close-review`);
  expect(closed.body).toMatchObject({ nextRevision: 1 });
  return batch;
}

describe('a batch that came back', () => {
  it('shows what came back and why, and takes the returned lines alone', async () => {
    const batch = await returnedBatch();
    const back = await contractor.get(batch.path);
    expect(back.body).toMatchObject({
      status: 'draft',
      revision: { number: 1 },
      counts: { lines: 1 },
      can: ['upload'],
    });
    expect((await recordsOf(contractor, batch)).map((line) => [line.structureNumber, line.state])).toEqual([
      ['L-1', 'approved'],
      ['L-2', 'returned'],
    ]);
    const [rejected] = await findingsOf(contractor, batch, '&state=rejected');
    expect(rejected).toMatchObject({
      code: 'unproved',
      decision: { action: 'correct', reason: 'Say when it was framed.' },
    });

    await uploadWorkbook(harness, contractor, {
      batch,
      site,
      workbook: {
        ...lines({ hardwareAt: '2026-04-14T11:00' }),
        pours: [
          ...lines().pours,
          pourRow('L-1', site.lot.number, { pourNumber: 2, pouredAt: '2026-04-14T10:05' }),
        ],
      },
    });
    // L-1 stands: it is no line of this revision, its pours are no orphans, and that is said in a note.
    expect((await recordsOf(contractor, batch)).map((line) => line.structureNumber)).toEqual(['L-2']);
    const found = await findingsOf(contractor, batch);
    expect(found.map((one) => [one.code, one.severity])).toEqual([['workbook-not-returned', 'note']]);
    expect(found[0]?.message).toContain('L-1');
    const changes = await contractor.get(`${batch.path}/changes`);
    expect(changes.body).toMatchObject({
      removed: [],
      findings: { gone: [{ code: 'unproved', structureNumber: 'L-2' }] },
    });

    const submitted = await contractor.post(`${batch.path}/submit`);
    expect(submitted.body).toMatchObject({ status: 'submitted', revision: { number: 1 } });
    expect((await recordsOf(inspector, batch)).map((line) => [line.structureNumber, line.state])).toEqual([
      ['L-2', 'undecided'],
    ]);
    expect((await recordsOf(inspector, batch, '&revision=0')).map((line) => line.state)).toEqual([
      'approved',
      'returned',
    ]);
  });

  it('is answered alone where nothing is to be corrected', async () => {
    const batch = await returnedBatch();
    const [rejected] = await findingsOf(contractor, batch, '&state=rejected');
    const answer = { text: 'Another contractor frames it next month.' };
    expect(
      (await contractor.put(`/api/findings/${rejected?.id}/answer`).send(answer)).body.answer,
    ).toMatchObject(answer);
    // Until it is handed in again, the answer is the contractor's own.
    expect((await findingsOf(inspector, batch, '&code=unproved'))[0]?.answer).toBeNull();
    await harness.drain();
    expect((await contractor.get(batch.path)).body).toMatchObject({
      status: 'checked',
      counts: { lines: 1, query: 1 },
    });
    await contractor.post(`${batch.path}/submit`);
    const [again] = await findingsOf(inspector, batch, '&code=unproved');
    expect(again).toMatchObject({ state: 'undecided', answer });
  });

  it('is withdrawn with its lines still returned', async () => {
    const batch = await returnedBatch();
    await uploadWorkbook(harness, contractor, { batch, site, workbook: lines() });
    await contractor.post(`${batch.path}/submit`);
    await contractor.post(`${batch.path}/withdraw`);
    await uploadWorkbook(harness, contractor, { batch, site, workbook: lines({ hardwareAt: 'not-by-us' }) });
    expect((await recordsOf(contractor, batch)).map((line) => line.structureNumber)).toEqual(['L-2']);
    expect((await contractor.post(`${batch.path}/submit`)).body.status).toBe('submitted');
  });
});

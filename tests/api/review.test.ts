import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rows } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { handIn, uploadLines, type HandedIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

type Finding = {
  id: string;
  recordId: string;
  code: string;
  structureNumber: string;
  version: number;
  state: string;
};
type RecordItem = { id: string; lineId: string; structureNumber: string; state: string; version: number };

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let inspector: Agent;
let colleague: Agent;
let engineer: Agent;
let inspectorPerson: Actor;
let batch: HandedIn;

const findings = async (agent: Agent = inspector): Promise<Finding[]> =>
  (await agent.get(`/api/batches/${batch.id}/findings?limit=200`)).body.items;
const records = async (agent: Agent = inspector): Promise<RecordItem[]> =>
  (await agent.get(`/api/batches/${batch.id}/records?limit=200`)).body.items;
const findingOf = async (structureNumber: string, code: string): Promise<Finding> => {
  const found = (await findings()).find(
    (one) => one.structureNumber === structureNumber && one.code === code,
  );
  if (!found) throw new Error(`${structureNumber} has no finding ${code}.`);
  return found;
};
const recordOf = async (structureNumber: string): Promise<RecordItem> => {
  const found = (await records()).find((one) => one.structureNumber === structureNumber);
  if (!found) throw new Error(`There is no line ${structureNumber}.`);
  return found;
};

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2', 'L-3', 'L-4'], number: '17' });
  contractor = await harness.signIn(site.contractor);
  inspectorPerson = await harness.person('inspector');
  inspector = await harness.signIn(inspectorPerson);
  colleague = await harness.signIn('inspector');
  engineer = await harness.signIn('engineer');
  batch = await handIn(harness, {
    site,
    agent: contractor,
    // Due depth 6.0 ft: the second and fourth are 0.5 ft short, the third 0.25 ft.
    set: [
      setRow('L-1'),
      setRow('L-2', { embedmentFt: 5.5 }),
      setRow('L-3', { embedmentFt: 5.75 }),
      setRow('L-4', { embedmentFt: 5.5 }),
    ],
  });
});
afterAll(() => harness.close());

describe('a review', () => {
  it('is decided only by the inspector who took the batch', async () => {
    const finding = await findingOf('L-2', 'embedment-short');
    const decision = { decision: 'approve', grounds: 'evidence', reason: 'The tape reads 6 ft.' };
    const early = await inspector
      .put(`/api/findings/${finding.id}/decision`)
      .set('If-Match', '"0"')
      .send(decision);
    expect([early.status, early.body.code]).toEqual([409, 'revision.not-taken']);

    const taken = await inspector.post(`/api/batches/${batch.id}/take`);
    expect(taken.body).toMatchObject({
      status: 'in-review',
      revision: { inspector: { id: inspectorPerson.id } },
    });
    const late = await colleague.post(`/api/batches/${batch.id}/take`);
    expect([late.status, late.body.code]).toEqual([409, 'revision.taken']);
    const foreign = await colleague
      .put(`/api/findings/${finding.id}/decision`)
      .set('If-Match', '"0"')
      .send(decision);
    expect([foreign.status, foreign.body.code]).toEqual([409, 'revision.taken']);
    const withdrawn = await contractor.post(`/api/batches/${batch.id}/withdraw`);
    expect([withdrawn.status, withdrawn.body.code]).toEqual([409, 'revision.taken']);
  });

  it('wants the version that was seen, a ground and a reason', async () => {
    const finding = await findingOf('L-2', 'embedment-short');
    const path = `/api/findings/${finding.id}/decision`;
    expect(
      (await inspector.put(path).send({ decision: 'approve', grounds: 'evidence', reason: 'x' })).status,
    ).toBe(428);
    const stale = await inspector
      .put(path)
      .set('If-Match', '"7"')
      .send({ decision: 'approve', grounds: 'evidence', reason: 'x' });
    expect([stale.status, stale.body.code, stale.body.current.id]).toEqual([
      412,
      'version.stale',
      finding.id,
    ]);
    const bare = await inspector
      .put(path)
      .set('If-Match', '"0"')
      .send({ decision: 'reject', action: 'rework', dueOn: '2099-01-01' });
    expect([bare.status, bare.body.errors[0].pointer]).toEqual([422, '/reason']);
    const answer = await inspector
      .put(path)
      .set('If-Match', '"0"')
      .send({ decision: 'approve', grounds: 'answer' });
    expect([answer.status, answer.body.code]).toEqual([422, 'decision.answer-settles-queries-only']);
  });

  it('decides, undoes and decides again, and the line follows', async () => {
    const finding = await findingOf('L-2', 'embedment-short');
    const path = `/api/findings/${finding.id}/decision`;
    const rejected = await inspector
      .put(path)
      .set('If-Match', '"0"')
      .send({ decision: 'reject', action: 'rework', dueOn: '2099-05-11', reason: 'Half a foot short.' });
    expect(rejected.body).toMatchObject({
      state: 'rejected',
      version: 1,
      decision: { action: 'rework', dueOn: '2099-05-11' },
    });
    expect((await recordOf('L-2')).state).toBe('returned');
    const undone = await inspector.delete(path).set('If-Match', '"1"');
    expect(undone.body).toMatchObject({ state: 'undecided', version: 2 });
    expect((await recordOf('L-2')).state).toBe('undecided');
    const again = await inspector
      .put(path)
      .set('If-Match', '"2"')
      .send({ decision: 'reject', action: 'rework', dueOn: '2099-05-11', reason: 'Half a foot short.' });
    expect(again.body.version).toBe(3);
    // The contractor is told nothing of a review that is still going on.
    expect((await findings(contractor)).every((one) => one.state === 'undecided')).toBe(true);
  });

  it('does not close over what is undecided, and names it', async () => {
    const refused = await inspector.post(`/api/batches/${batch.id}/close-review`);
    expect([refused.status, refused.body.code]).toEqual([409, 'review.undecided']);
    expect(refused.body.undecided.map((one: { structureNumber: string }) => one.structureNumber)).toEqual([
      'L-1',
      'L-3',
      'L-4',
    ]);
  });

  it('approves a line without findings by its own word only', async () => {
    const short = await recordOf('L-3');
    const open = await inspector
      .put(`/api/records/${short.id}/decision`)
      .set('If-Match', '"0"')
      .send({ decision: 'approve' });
    expect([open.status, open.body.code]).toEqual([409, 'decision.findings-open']);
    const clean = await inspector.post(`/api/batches/${batch.id}/approve-clean`);
    expect(clean.body).toEqual({ approved: 1 });
    expect(await recordOf('L-1')).toMatchObject({ state: 'approved', version: 1 });
  });

  it('approves on evidence, and asks for a concession that an inspector cannot grant', async () => {
    const third = await findingOf('L-3', 'embedment-short');
    const approved = await inspector
      .put(`/api/findings/${third.id}/decision`)
      .set('If-Match', '"0"')
      .send({ decision: 'approve', grounds: 'evidence', reason: 'The photograph reads 6.0 ft.' });
    expect(approved.body).toMatchObject({ state: 'approved', decision: { grounds: 'evidence' } });

    const fourth = await findingOf('L-4', 'embedment-short');
    const asked = await inspector
      .post(`/api/findings/${fourth.id}/concession`)
      .send({ reason: 'Rock at 5.5 ft.' });
    expect(asked.status).toBe(201);
    expect(asked.body).toMatchObject({ number: 'C-0001', state: 'asked', askedReason: 'Rock at 5.5 ft.' });
    expect((await recordOf('L-4')).state).toBe('held');
    const self = await inspector
      .put(`/api/concessions/${asked.body.id}/decision`)
      .set('If-Match', '"1"')
      .send({ decision: 'grant', reason: 'Fine.' });
    expect(self.status).toBe(403);
  });

  it('closes: approved stand, returned make the next revision, held wait for the engineer', async () => {
    const closed = await inspector.post(`/api/batches/${batch.id}/close-review`);
    const idOf = async (number: string) => (await recordOf(number)).id;
    expect(closed.body).toEqual({
      approved: [await idOf('L-1'), await idOf('L-3')],
      returned: [await idOf('L-2')],
      held: [await idOf('L-4')],
      nextRevision: 1,
    });
    const shown = await contractor.get(`/api/batches/${batch.id}`);
    expect(shown.body).toMatchObject({ status: 'draft', revision: { number: 1, dueOn: '2099-05-11' } });

    await harness.drain();
    const mail = await rows<{ subject: string; source: string }>(
      harness.em(),
      `select subject, source from captured_mail where $1 = any(recipients) and subject like '%returned%'`,
      [site.contractor.email],
    );
    expect(mail.map((one) => one.subject)).toEqual([
      `Batch ${batch.number}: 1 line returned, due 11 May 2099`,
    ]);
    expect(mail[0]?.source).toContain('Half a foot short.');
  });

  it('lets the engineer grant, and the held line is approved as not conforming', async () => {
    const [concession] = (await engineer.get('/api/concessions?state=asked')).body.items;
    const empty = await engineer
      .put(`/api/concessions/${concession.id}/decision`)
      .set('If-Match', '"1"')
      .send({ decision: 'grant', reason: ' ' });
    expect([empty.status, empty.body.errors[0].pointer]).toEqual([422, '/reason']);
    const granted = await engineer
      .put(`/api/concessions/${concession.id}/decision`)
      .set('If-Match', '"1"')
      .send({
        decision: 'grant',
        reason: 'Rock carries it.',
        condition: 'Measure the lean again.',
        endsOn: '2099-09-01',
      });
    expect(granted.body).toMatchObject({
      state: 'granted',
      condition: 'Measure the lean again.',
      endsOn: '2099-09-01',
      version: 2,
    });
    const twice = await engineer
      .put(`/api/concessions/${concession.id}/decision`)
      .set('If-Match', '"2"')
      .send({ decision: 'refuse', reason: 'No.' });
    expect([twice.status, twice.body.code]).toEqual([409, 'concession.answered']);
    expect((await recordOf('L-4')).state).toBe('approved');
    const listed = await engineer.get('/api/nonconformities?grounds=concession');
    expect(listed.body.items).toMatchObject([
      {
        structureNumber: 'L-4',
        code: 'embedment-short',
        measured: 5.5,
        limit: 6,
        margin: -0.5,
        concession: 'C-0001',
      },
    ]);
  });

  it('takes the corrected line back as revision 1 and decides it', async () => {
    await uploadLines(harness, {
      site,
      agent: contractor,
      batchId: batch.id,
      set: [setRow('L-2', { embedmentFt: 6 })],
    });
    const submitted = await contractor.post(`/api/batches/${batch.id}/submit`);
    expect(submitted.body).toMatchObject({
      status: 'submitted',
      revision: { number: 1 },
      counts: { lines: 1 },
    });
    expect((await inspector.post(`/api/batches/${batch.id}/take`)).status).toBe(200);
    for (const finding of await findings())
      await inspector
        .put(`/api/findings/${finding.id}/decision`)
        .set('If-Match', `"${finding.version}"`)
        .send({ decision: 'approve', grounds: 'evidence', reason: 'Dug out and measured again.' });
    await inspector.post(`/api/batches/${batch.id}/approve-clean`);
    const closed = await inspector.post(`/api/batches/${batch.id}/close-review`);
    expect(closed.body).toMatchObject({ returned: [], held: [], nextRevision: null });
    expect(closed.body.approved).toHaveLength(1);
  });

  it('reopens an approved line with a reason, until it is decided again', async () => {
    const record = await recordOf('L-2');
    const bare = await inspector.post(`/api/records/${record.id}/reopen`).send({ reason: ' ' });
    expect([bare.status, bare.body.errors[0].pointer]).toEqual([422, '/reason']);
    const reopened = await inspector
      .post(`/api/records/${record.id}/reopen`)
      .send({ reason: 'A second look at the tape.' });
    expect(reopened.body).toMatchObject({ state: 'undecided' });
    const returned = await colleague
      .put(`/api/records/${record.id}/decision`)
      .set('If-Match', `"${reopened.body.version}"`)
      .send({ decision: 'return', reason: 'Photograph the tape in the bore again.' });
    expect(returned.body).toMatchObject({ state: 'returned' });
    expect((await contractor.get(`/api/batches/${batch.id}`)).body).toMatchObject({
      status: 'draft',
      revision: { number: 2 },
    });
  });
});

import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { rows, run } from '#server/db/rows.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { createStandard } from '#tests/factories/standards.ts';
import {
  findingsOf,
  recordsOf,
  startBatch,
  uploadWorkbook,
  type HandedIn,
} from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let foreign: Agent;
let inspector: Agent;
let batch: HandedIn;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  foreign = await harness.signIn('contractor');
  inspector = await harness.signIn('inspector');
});
afterAll(() => harness.close());
beforeEach(async () => {
  batch = await startBatch(contractor, site);
});

const upload = (values = {}) =>
  uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: [setRow('L-1', values), setRow('L-2')],
      pours: [...pourRows('L-1', site.lot.number), ...pourRows('L-2', site.lot.number)],
    },
  });
const submit = (agent = contractor) => agent.post(`${batch.path}/submit`);
const trailOf = async () => {
  const found = await rows<{ action: string }>(
    harness.em(),
    `select action from trail where subject_id = $1 order by seq`,
    [batch.id],
  );
  return found.map((entry) => entry.action);
};

describe('submitting', () => {
  it('freezes the revision, tells both sides and leaves its trail', async () => {
    await upload();
    const reply = await submit();
    expect(reply.status).toBe(200);
    expect(reply.body).toMatchObject({ status: 'submitted', revision: { number: 0, standards: [1] } });
    expect((await submit()).body).toMatchObject({ status: 409, code: 'revision.frozen' });
    const put = await contractor
      .put(`${batch.path}/workbook`)
      .attach('workbook', Buffer.from('PK'), 'b.xlsx');
    expect(put.body).toMatchObject({ status: 409, code: 'revision.frozen' });
    const photos = await contractor.post(`${batch.path}/photos`).attach('photos', Buffer.from('x'), 'b.jpg');
    expect(photos.body).toMatchObject({ status: 409, code: 'revision.frozen' });
    const [finding] = await findingsOf(contractor, batch);
    const answer = await contractor.put(`/api/findings/${finding?.id}/answer`).send({ text: 'Late.' });
    expect(answer.body).toMatchObject({ status: 409, code: 'revision.frozen' });
    expect(await trailOf()).toEqual([
      'batch.created',
      'batch.workbook-uploaded',
      'batch.checked',
      'batch.submitted',
    ]);
    const mail = await rows<{ recipient: string; audience: string }>(
      harness.em(),
      `select recipient, data ->> 'audience' as audience from outbox where data ->> 'batchId' = $1 order by audience`,
      [batch.id],
    );
    expect(mail).toMatchObject([{ recipient: site.contractor.email }, { audience: 'inspector' }]);
  });

  it('twice at once hands in once', async () => {
    await upload();
    const replies = await Promise.all([submit(), submit(), submit()]);
    expect(replies.map((reply) => reply.status).toSorted((a, b) => a - b)).toEqual([200, 409, 409]);
    expect((await trailOf()).filter((action) => action === 'batch.submitted')).toHaveLength(1);
  });

  it('is refused before there is a line, while a check is due, and while a record is incomplete', async () => {
    expect((await submit()).body).toMatchObject({ status: 409, code: 'revision.empty' });
    const bytes = await workbookFile({ workOrder: site.order.number, set: [setRow('L-1')] });
    await contractor.put(`${batch.path}/workbook`).attach('workbook', bytes, 'b.xlsx');
    expect((await submit()).body).toMatchObject({ status: 409, code: 'revision.check-running' });
    await upload({ leanInPer10Ft: null });
    expect((await submit()).body).toMatchObject({ status: 409, code: 'revision.incomplete' });
    expect((await contractor.get(batch.path)).body).toMatchObject({ status: 'checked', can: ['upload'] });
    await upload({ embedmentFt: 5.9 });
    expect((await submit()).status).toBe(200);
  });

  it('is refused when the standard changed after the check', async () => {
    await upload();
    const [author, approver] = [await harness.person('engineer'), await harness.person('engineer')];
    const newer = {
      authorId: author.id,
      approverId: approver.id,
      effectiveOn: '2026-04-01',
      body: DEMO_STANDARD,
    };
    await createStandard(harness.em(), newer);
    expect((await submit()).body).toMatchObject({ status: 409, code: 'revision.standard-changed' });
    await upload({ foreman: 'Another' });
    expect((await submit()).body).toMatchObject({ status: 'submitted', revision: { standards: [2] } });
  });

  it('is the contractor’s own', async () => {
    await upload();
    expect((await submit(foreign)).status).toBe(404);
    expect((await submit(inspector)).status).toBe(403);
    const other = await harness.signIn(await harness.person('contractor', { orgId: site.contractor.orgId }));
    expect((await submit(other)).status).toBe(200);
  });
});

describe('submitting what was not seen', () => {
  it('is refused when something came in since, and taken once the newest is looked at', async () => {
    await upload();
    const { input } = (await contractor.get(batch.path)).body as { input: number };
    await upload({ embedmentFt: 5.5 });
    const stale = await contractor.post(`${batch.path}/submit?input=${input}`);
    expect(stale.body).toMatchObject({ status: 409, code: 'revision.newer-input' });
    const newest = (await contractor.get(batch.path)).body as { input: number };
    expect(newest.input).toBeGreaterThan(input);
    const reply = await contractor.post(`${batch.path}/submit?input=${newest.input}`);
    expect(reply.body.status).toBe('submitted');
  });
});

describe('withdrawing', () => {
  const withdraw = (agent = contractor) => agent.post(`${batch.path}/withdraw`);

  it('makes it a draft again that may be changed and submitted anew', async () => {
    await upload();
    expect((await withdraw()).body).toMatchObject({ status: 409, code: 'revision.not-submitted' });
    await submit();
    expect((await withdraw(foreign)).status).toBe(404);
    const reply = await withdraw();
    expect(reply.body).toMatchObject({
      status: 'checked',
      revision: { submittedAt: null },
      can: ['upload', 'submit'],
    });
    expect(await rows(harness.em(), 'select 1 from finding_states where batch_id = $1', [batch.id])).toEqual(
      [],
    );
    await upload({ embedmentFt: 5.5 });
    expect((await submit()).body.status).toBe('submitted');
    const [found] = await findingsOf(inspector, batch, '&code=embedment-short');
    expect(found).toMatchObject({ measured: 5.5, state: 'undecided' });
  });

  it('is refused once an inspector has taken it', async () => {
    await upload();
    await submit();
    const taker = await harness.person('inspector');
    await run(
      harness.em(),
      `update revisions set status = 'in-review', inspector_id = $2, taken_at = now() where batch_id = $1`,
      [batch.id, taker.id],
    );
    expect((await withdraw()).body).toMatchObject({ status: 409, code: 'revision.taken' });
  });
});

describe('the wall', () => {
  const READS = ['', '/check', '/inputs', '/changes', '/photos', '/records', '/findings', '/revisions'];

  it.each(READS)(
    'GET batch%s is the owner’s and the contractor’s, and not another contractor’s',
    async (part) => {
      await upload();
      await submit();
      expect((await contractor.get(batch.path + part)).status).toBe(200);
      expect((await inspector.get(batch.path + part)).status).toBe(200);
      const wall = await foreign.get(batch.path + part);
      expect(wall.body).toMatchObject({ status: 404, code: 'not-found' });
      expect(wall.text).not.toContain(batch.number);
      expect((await foreign.get('/api/batches')).body).toMatchObject({ items: [], total: 0 });
    },
  );

  it('hides what is in a draft from the owner’s people', async () => {
    await upload({ embedmentFt: 5.5 });
    const { body } = await inspector.get(batch.path);
    expect(body).toMatchObject({
      number: batch.number,
      status: 'checked',
      workbook: { fileName: null, sha256: null },
      counts: { lines: 0, nonconformity: 0, photos: 0 },
      can: [],
    });
    expect(await recordsOf(inspector, batch)).toEqual([]);
    expect(await findingsOf(inspector, batch)).toEqual([]);
    for (const part of ['/inputs', '/photos', '/changes'])
      expect((await inspector.get(batch.path + part)).body.items).toEqual([]);
    const [record] = await recordsOf(contractor, batch);
    expect((await inspector.get(`/api/records/${record?.id}`)).status).toBe(404);
    expect((await contractor.get(`/api/records/${record?.id}`)).status).toBe(200);
    expect((await foreign.get(`/api/records/${record?.id}`)).status).toBe(404);
  });
});

describe('lists', () => {
  it('page and filter, and refuse nonsense naming the field', async () => {
    await upload();
    await submit();
    const first = await inspector.get('/api/batches?limit=1&status=submitted&status=checked');
    expect(first.body.items).toMatchObject([{ id: batch.id, status: 'submitted' }]);
    const next = await inspector.get(
      `/api/batches?limit=1&status=submitted&status=checked&cursor=${first.body.nextCursor}`,
    );
    expect(next.body.items).toHaveLength(1);
    expect(next.body.items[0].id).not.toBe(batch.id);
    for (const [query, field] of [
      ['cursor=xx', 'cursor'],
      ['status=lost', 'status'],
      ['limit=0', 'limit'],
      ['colour=red', 'colour'],
    ] as const) {
      const reply = await inspector.get(`/api/batches?${query}`);
      expect(reply.status).toBe(400);
      expect(reply.body.errors[0].pointer).toContain(field);
    }
    const lines = await inspector.get(`${batch.path}/records?limit=1`);
    expect(lines.body).toMatchObject({ total: 2, items: [{ structureNumber: 'L-1' }] });
    const rest = await inspector.get(`${batch.path}/records?limit=1&cursor=${lines.body.nextCursor}`);
    expect(rest.body).toMatchObject({ total: null, nextCursor: null, items: [{ structureNumber: 'L-2' }] });
    expect((await inspector.get(`${batch.path}/records?state=approved`)).body.items).toEqual([]);
    expect(
      (await inspector.get(`${batch.path}/records?structure=l-2&state=undecided`)).body.items,
    ).toHaveLength(1);
  });
});

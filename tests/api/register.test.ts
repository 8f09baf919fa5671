import { createHash } from 'node:crypto';
import { read, utils, type WorkSheet } from '@e965/xlsx';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import { handIn, type HandedIn } from '#tests/factories/hand-in.ts';
import { setRow } from '#tests/factories/set-row.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let clerk: Agent;
let auditor: Agent;
let inspector: Agent;
let batch: HandedIn;

const recordIds = async (of: HandedIn): Promise<Record<string, string>> => {
  const reply = await inspector.get(`/api/batches/${of.id}/records?limit=200`);
  return Object.fromEntries(
    reply.body.items.map((one: { structureNumber: string; id: string }) => [one.structureNumber, one.id]),
  );
};

/** Takes, approves what is clean, grants a concession on what is short, closes. */
async function review(of: HandedIn): Promise<void> {
  await inspector.post(`/api/batches/${of.id}/take`);
  const found = await inspector.get(`/api/batches/${of.id}/findings`);
  for (const finding of found.body.items) {
    if (finding.code !== 'already-on-record')
      await inspector.post(`/api/findings/${finding.id}/concession`).send({ reason: 'Rock at 5.5 ft.' });
    else
      await inspector
        .put(`/api/findings/${finding.id}/decision`)
        .set('If-Match', `"${finding.version}"`)
        .send({ decision: 'approve', grounds: 'evidence', reason: 'The same pole, measured again.' });
  }
  await inspector.post(`/api/batches/${of.id}/approve-clean`);
  const closed = await inspector.post(`/api/batches/${of.id}/close-review`);
  if (closed.status !== 200) throw new Error(closed.text);
  const engineer = await harness.signIn('engineer');
  for (const concession of (await engineer.get('/api/concessions?state=asked')).body.items)
    await engineer
      .put(`/api/concessions/${concession.id}/decision`)
      .set('If-Match', '"1"')
      .send({ decision: 'grant', reason: 'Rock carries it.', condition: '=HYPERLINK("x")' });
}

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'], number: '17' });
  contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
  clerk = await harness.signIn('clerk');
  auditor = await harness.signIn('auditor');
  batch = await handIn(harness, {
    site,
    agent: contractor,
    set: [setRow('L-1', { notes: '=1+1' }), setRow('L-2', { embedmentFt: 5.5 })],
  });
});
afterAll(() => harness.close());

describe('the register', () => {
  it('takes approved lines only, all or nothing', async () => {
    const ids = await recordIds(batch);
    const early = await clerk.post('/api/register/entries').send({ recordIds: Object.values(ids) });
    expect([early.status, early.body.code, early.body.errors.length]).toEqual([
      409,
      'register.not-approved',
      2,
    ]);
    expect((await clerk.get('/api/register')).body.total).toBe(0);
    await review(batch);
    const waiting = await clerk.get('/api/register/candidates');
    expect(
      waiting.body.items.map((one: { structureNumber: string; nonconforming: boolean }) => [
        one.structureNumber,
        one.nonconforming,
      ]),
    ).toEqual([
      ['L-1', false],
      ['L-2', true],
    ]);
  });

  it('enters them, and the batch is on record', async () => {
    const ids = await recordIds(batch);
    const body = { recordIds: [ids['L-1'], ids['L-2']] };
    const entered = await clerk.post('/api/register/entries').set('Idempotency-Key', 'enter-1').send(body);
    expect(entered.status).toBe(201);
    expect(
      entered.body.entries.map((one: { recordNumber: string; version: number }) => [
        one.recordNumber,
        one.version,
      ]),
    ).toEqual([
      ['R-000001', 1],
      ['R-000002', 1],
    ]);
    const again = await clerk.post('/api/register/entries').set('Idempotency-Key', 'enter-1').send(body);
    expect(again.body).toEqual(entered.body);
    const twice = await clerk.post('/api/register/entries').send(body);
    expect(twice.status).toBe(409);
    expect((await contractor.get(`/api/batches/${batch.id}`)).body.status).toBe('on-record');
  });

  it('is filtered, and shows a contractor only their own', async () => {
    const numbers = async (agent: Agent, query: string) =>
      (await agent.get(`/api/register?${query}`)).body.items.map(
        (one: { recordNumber: string }) => one.recordNumber,
      );
    expect(await numbers(auditor, 'conforming=no')).toEqual(['R-000002']);
    expect(await numbers(auditor, 'q=L-1')).toEqual(['R-000001']);
    expect(await numbers(auditor, `lot=${site.lot.number}&sort=structure`)).toEqual(['R-000001', 'R-000002']);
    expect(await numbers(auditor, 'from=2026-04-15')).toEqual([]);
    expect(await numbers(auditor, 'rule=embedment-short')).toEqual(['R-000002']);
    expect(await numbers(contractor, '')).toHaveLength(2);
    const foreign = await harness.signIn('contractor');
    expect(await numbers(foreign, '')).toEqual([]);
    expect((await foreign.get('/api/register/R-000001')).status).toBe(404);
    expect((await contractor.get('/api/register/R-000001')).status).toBe(200);
    const nonsense = await auditor.get('/api/register?cursor=zzz');
    expect([nonsense.status, nonsense.body.errors[0].pointer]).toEqual([400, '#/query/cursor']);
  });

  it('goes on in pages without losing or doubling a row', async () => {
    const first = await auditor.get('/api/register?limit=1&sort=structure');
    expect(first.body.items).toHaveLength(1);
    const second = await auditor.get(`/api/register?limit=1&sort=structure&cursor=${first.body.nextCursor}`);
    expect(second.body.items[0].recordNumber).toBe('R-000002');
    expect(second.body.nextCursor).toBeNull();
  });

  it('exports CSV that no spreadsheet runs', async () => {
    const csv = await auditor.get('/api/register/export.csv?sort=structure').buffer();
    expect(csv.status).toBe(400);
    const plain = await auditor.get('/api/register/export.csv');
    expect(plain.text.split('\r\n')[0]).toBe(
      '\uFEFFRecord,Version,Current,Structure,Kind,Contractor,Work order,Installed on,Pole,Embedment (ft),Depth due (ft),Fill ratio,Fill ratio U (k = 2),Lots,Conforming,Concessions,Latitude,Longitude,Entered at,Entered by',
    );
    expect(plain.text).toContain('R-000002,1,yes,L-2,set,');
    const findings = await auditor.get('/api/nonconformities/export.csv');
    expect(findings.text).toContain('embedment-short');
    expect(findings.text).toContain(`"'=HYPERLINK(""x"")"`);
  });

  it('supersedes, never overwrites, and wants to know why', async () => {
    const later = await handIn(harness, {
      site,
      agent: contractor,
      set: [setRow('L-1', { embedmentFt: 6.1, boreDepthFt: 6.1 })],
    });
    await review(later);
    const ids = await recordIds(later);
    const bare = await clerk.post('/api/register/entries').send({ recordIds: [ids['L-1']] });
    expect([bare.status, bare.body.errors[0].pointer]).toEqual([422, '/reason']);
    const entered = await clerk
      .post('/api/register/entries')
      .send({ recordIds: [ids['L-1']], reason: 'Measured again.' });
    expect(entered.body.entries).toMatchObject([{ recordNumber: 'R-000001', version: 2 }]);
    const versions = await clerk.get('/api/register/R-000001');
    expect(
      versions.body.items.map((one: { version: number; current: boolean; embedmentFt: number }) => [
        one.version,
        one.current,
        one.embedmentFt,
      ]),
    ).toEqual([
      [2, true, 6.1],
      [1, false, 6],
    ]);
  });
});

describe('a transmittal', () => {
  const rowsOf = (sheet: WorkSheet | undefined): Record<string, unknown>[] =>
    utils.sheet_to_json<Record<string, unknown>>(sheet as WorkSheet, { range: 0, raw: true }).slice(2);

  it('issues an as-built that is what the register says', async () => {
    const asked = await clerk.post('/api/transmittals').send({ scope: { workOrder: site.order.id } });
    expect(asked.status).toBe(202);
    expect(asked.body).toMatchObject({ number: 'T-0001', revision: 0, state: 'queued', rows: 2 });
    const early = await clerk.get(`/api/transmittals/${asked.body.id}/file`);
    expect([early.status, early.body.code]).toEqual([409, 'transmittal.not-issued']);
    await harness.drain();
    const issued = (await auditor.get(`/api/transmittals/${asked.body.id}`)).body;
    expect(issued).toMatchObject({ state: 'issued', rows: 2, done: 2 });

    const file = await auditor.get(`/api/transmittals/${asked.body.id}/file`).responseType('blob');
    const bytes = file.body as Buffer;
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(issued.sha256);
    const book = read(bytes);
    expect(book.SheetNames).toEqual([
      'Cover',
      'Set',
      'Straighten',
      'Re-level',
      'Pours',
      'Events',
      'Findings',
    ]);
    const set = rowsOf(book.Sheets['Set']);
    expect(
      set.map((row) => [
        row['recordNumber'],
        row['version'],
        row['structureNumber'],
        row['embedmentFt'],
        row['conforms'],
      ]),
    ).toEqual([
      ['R-000001', 2, 'L-1', 6.1, 'yes'],
      ['R-000002', 1, 'L-2', 5.5, 'no'],
    ]);
    // Excel serial of 2026-04-14 10:05: 46126 days (1900 system, derived) and 605/1440 of a day.
    expect(set[1]?.['letGoAt']).toBeCloseTo(46126 + 605 / 1440, 6);
    expect(rowsOf(book.Sheets['Pours'])).toHaveLength(4);
    const findings = rowsOf(book.Sheets['Findings']);
    expect(findings).toMatchObject([
      { recordNumber: 'R-000001', code: 'already-on-record', grounds: 'evidence' },
      {
        recordNumber: 'R-000002',
        code: 'embedment-short',
        measured: 5.5,
        limit: 6,
        grounds: 'concession',
        concession: 'C-0001',
      },
    ]);
    expect(findings[1]?.['condition']).toBe(`'=HYPERLINK("x")`);
    const cover = utils.sheet_to_json<unknown[]>(book.Sheets['Cover'] as WorkSheet, { header: 1 });
    const said = Object.fromEntries(cover.map(([key, , value]) => [key, value]));
    expect(said).toMatchObject({
      transmittal: 'T-0001',
      revision: 0,
      digest: issued.contentDigest,
      'count:Set': 2,
      nonconforming: 1,
    });
  });

  it('stays byte for byte as issued, and the same content has the same digest', async () => {
    const [first] = (await clerk.get('/api/transmittals')).body.items;
    const again = await clerk
      .post('/api/transmittals')
      .send({ scope: { workOrder: site.order.id }, supersedes: first.id });
    expect(again.body).toMatchObject({ number: 'T-0001', revision: 1 });
    await harness.drain();
    const second = (await clerk.get(`/api/transmittals/${again.body.id}`)).body;
    expect(second.contentDigest).toBe(first.contentDigest);
    const old = await clerk.get(`/api/transmittals/${first.id}/file`).responseType('blob');
    expect(
      createHash('sha256')
        .update(old.body as Buffer)
        .digest('hex'),
    ).toBe(first.sha256);
    const twice = await clerk
      .post('/api/transmittals')
      .send({ scope: { workOrder: site.order.id }, supersedes: first.id });
    expect([twice.status, twice.body.code]).toEqual([409, 'transmittal.superseded']);
    await expect(
      run(harness.em(), `update transmittals set title = 'x' where id = $1`, [first.id]),
    ).rejects.toThrow(/issued/);
  });

  it('names on its cover what a filter has by id', async () => {
    const asked = await clerk
      .post('/api/transmittals')
      .send({ scope: { filter: { workOrder: site.order.id, kind: 'set' } } });
    await harness.drain();
    const file = await clerk.get(`/api/transmittals/${asked.body.id}/file`).responseType('blob');
    const cover = utils.sheet_to_json<unknown[]>(read(file.body as Buffer).Sheets['Cover'] as WorkSheet, {
      header: 1,
    });
    const scope = String(cover.find(([key]) => key === 'scope')?.[2]);
    expect(scope).toContain('workOrder: 17, ');
    expect(scope).toContain('kind: set');
    expect(scope).not.toContain(site.order.id);
  });

  it('refuses an empty scope and an unknown record', async () => {
    const empty = await clerk.post('/api/transmittals').send({ scope: { filter: { q: 'nothing' } } });
    expect([empty.status, empty.body.code]).toEqual([422, 'transmittal.empty']);
    const unknown = await clerk
      .post('/api/transmittals')
      .send({ scope: { recordNumbers: ['R-000001', 'R-999999'] } });
    expect([unknown.status, unknown.body.code]).toEqual([422, 'transmittal.unknown-record']);
    const filter = await clerk.post('/api/transmittals').send({ scope: { filter: { nonsense: 'x' } } });
    expect([filter.status, filter.body.errors[0].pointer]).toEqual([400, '#/query/nonsense']);
  });

  it('leaves a trail that verifies', async () => {
    const verdict = await auditor.get('/api/trail/verify');
    expect(verdict.body).toMatchObject({ ok: true, brokenAt: null });
    const trail = await auditor.get('/api/trail?action=transmittal.issued');
    expect(trail.body.items).toHaveLength(3);
  });
});

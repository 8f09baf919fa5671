import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rows } from '#server/db/rows.ts';
import { ENGINE } from '#server/modules/check/engine.ts';
import { checkRevision } from '#server/modules/check/check-revision.ts';
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
let foreign: Agent;
let inspector: Agent;
let batch: HandedIn;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2', 'L-3'] });
  contractor = await harness.signIn(site.contractor);
  foreign = await harness.signIn('contractor');
  inspector = await harness.signIn('inspector');
  batch = await startBatch(contractor, site);
  await uploadPhotographs(contractor, batch, ['L-1 kits.jpg']);
  await uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: [setRow('L-1', { embedmentFt: 5.9 }), setRow('L-2', { hardwareAt: null }), setRow('L-3')],
      pours: [
        ...pourRows('L-1', site.lot.number),
        ...pourRows('L-2', site.lot.number),
        ...pourRows('L-3', site.lot.number),
      ],
    },
  });
});
afterAll(() => harness.close());

describe('a finding', () => {
  it('names the cell, and carries words and what may be done', async () => {
    const [found] = await findingsOf(contractor, batch, '&code=embedment-short');
    const [record] = await recordsOf(contractor, batch);
    expect(found).toMatchObject({
      recordId: record?.id,
      lineId: record?.lineId,
      structureNumber: 'L-1',
      sheet: 'Set',
      row: 4,
      cell: expect.stringMatching(/^[A-Z]+4$/u),
      field: 'embedmentFt',
      severity: 'nonconformity',
      state: 'undecided',
      decision: null,
      version: 0,
      can: ['answer'],
    });
    expect(found?.message).toContain('5.9 ft');
  });

  it('is answered, and keeps its answer over a new check', async () => {
    const [query] = await findingsOf(contractor, batch, '&code=unproved');
    const path = `/api/findings/${query?.id}/answer`;
    const reply = await contractor.put(path).send({ text: ' Framed by another crew. ' });
    expect(reply.body.answer).toMatchObject({ text: 'Framed by another crew.', by: site.contractor.name });
    expect((await contractor.put(path).send({ text: '   ' })).status).toBe(400);
    expect((await foreign.put(path).send({ text: 'No.' })).status).toBe(404);
    expect((await inspector.put(path).send({ text: 'No.' })).status).toBe(403);
    await uploadPhotographs(contractor, batch, ['L-2 kits.jpg']);
    await harness.drain();
    const [again] = await findingsOf(contractor, batch, '&code=unproved');
    expect(again?.id).not.toBe(query?.id);
    expect(again?.answer?.text).toBe('Framed by another crew.');
  });
});

describe('a record sheet', () => {
  it('carries cells, pours, findings, photographs, history and its title block', async () => {
    const [record] = await recordsOf(contractor, batch);
    const { body } = await contractor.get(`/api/records/${record?.id}`);
    expect(body.record).toMatchObject({ structureNumber: 'L-1', workDay: '2026-04-14', standard: 1 });
    expect(body.cells.embedmentFt).toMatchObject({ raw: '5.9' });
    expect(body.pours).toMatchObject([
      { pourNumber: 1, kitFt3: 1.5, lot: site.lot.number, pouredAt: '2026-04-14T10:00', componentATempF: 72 },
      { pourNumber: 1, kitFt3: 8, product: 'EP-15', wastedQuantity: 0 },
    ]);
    expect(body.findings.map((one: { code: string }) => one.code)).toContain('embedment-short');
    expect(body.photos).toMatchObject([{ fileName: 'L-1 kits.jpg', view: 'kits' }]);
    expect(body.titleBlock).toMatchObject({
      structure: 'L-1',
      pole: expect.stringMatching(/^40 ft class 4, .*pine$/u),
      measuredOn: '2026-04-14T09:40',
      standard: '1',
      revision: '0',
    });
    expect(body.registerEntry).toBeNull();
  });
});

describe('what changed', () => {
  it('is told by value and by finding against the workbook before', async () => {
    await uploadWorkbook(harness, contractor, {
      batch,
      site,
      workbook: {
        set: [setRow('L-1', { embedmentFt: 6 }), setRow('L-2', { hardwareAt: null })],
        pours: [
          pourRow('L-1', site.lot.number),
          pourRow('L-1', site.lot.number, { kitFt3: 2.5 }),
          ...pourRows('L-2', site.lot.number),
        ],
      },
    });
    const { body } = await contractor.get(`${batch.path}/changes`);
    expect(body.removed).toEqual(['L-3']);
    expect(body.added).toEqual([]);
    expect(body.items).toContainEqual(
      expect.objectContaining({
        structureNumber: 'L-1',
        field: 'embedmentFt',
        title: 'Embedment',
        before: 5.9,
        after: 6,
      }),
    );
    expect(body.findings.gone).toContainEqual({
      code: 'embedment-short',
      title: expect.any(String),
      structureNumber: 'L-1',
    });
    expect((await foreign.get(`${batch.path}/changes`)).status).toBe(404);
  });
});

describe('the check', () => {
  it('repeated replaces nothing', async () => {
    const [revision] = await rows<{ id: string; input: number; run_id: string; version: number }>(
      harness.em(),
      'select id, input, run_id, version from revisions where batch_id = $1',
      [batch.id],
    );
    const context = {
      services: harness.services,
      em: harness.em(),
      job: { id: 'again', attempt: 2, last: false },
      signal: new AbortController().signal,
    };
    await checkRevision({ revisionId: revision?.id ?? '', input: revision?.input ?? 0 }, context);
    // An older input has nothing to say any more.
    await checkRevision({ revisionId: revision?.id ?? '', input: 1 }, { ...context, em: harness.em() });
    const after = await rows(
      harness.em(),
      'select id, input, run_id, version from revisions where batch_id = $1',
      [batch.id],
    );
    expect(after).toEqual([revision]);
  });

  it('left half done by a process that died is done by the next', async () => {
    const other = await startBatch(contractor, site);
    await uploadWorkbook(harness, contractor, {
      batch: other,
      site,
      workbook: { set: [setRow('L-1')], pours: pourRows('L-1', site.lot.number) },
    });
    const em = harness.em();
    const [revision] = await rows<{ id: string }>(
      em,
      `update revisions set status = 'checking', run_id = null, input = 2 where batch_id = $1 returning id`,
      [other.id],
    );
    await rows(
      em,
      `insert into check_runs (revision_id, input, engine, schema, state, started_at) values ($1, 2, $2, 'v1', 'running', now())`,
      [revision?.id, ENGINE],
    );
    await checkRevision(
      { revisionId: revision?.id ?? '', input: 2 },
      {
        services: harness.services,
        em: harness.em(),
        job: { id: 'b', attempt: 2, last: false },
        signal: new AbortController().signal,
      },
    );
    expect((await contractor.get(other.path)).body).toMatchObject({
      status: 'checked',
      counts: { lines: 1 },
    });
    expect((await contractor.get(`${other.path}/check`)).body).toMatchObject({
      input: 2,
      state: 'done',
      done: 1,
      total: 1,
    });
  });

  it('names a workbook of another order', async () => {
    const other = await startBatch(contractor, site);
    await uploadWorkbook(harness, contractor, {
      batch: other,
      site,
      workbook: { workOrder: 'WO-ELSEWHERE', set: [setRow('L-1')], pours: pourRows('L-1', site.lot.number) },
    });
    const [found] = await findingsOf(contractor, other, '&code=workbook-other-order');
    expect(found).toMatchObject({
      severity: 'nonconformity',
      sheet: 'Batch',
      recordId: null,
      title: 'Another work order',
    });
    expect(found?.message).toContain('WO-ELSEWHERE');
  });
});

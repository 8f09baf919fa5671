import { read, utils, type WorkSheet } from '@e965/xlsx';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
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
import { mixedWorkbook, PLANNED, viewsOf } from './mixed-workbook.ts';

/** One batch of all three kinds of work, from the workbook that a contractor uploads to the workbook that the owner issues. */

const POURED = [
  'structureNumber',
  'kind',
  'event',
  'product',
  'kitFt3',
  'quantity',
  'componentATempF',
  'airTempF',
  'notes',
];

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let inspector: Agent;
let clerk: Agent;
let batch: HandedIn;

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: PLANNED, number: '17' });
  contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
  clerk = await harness.signIn('clerk');
  batch = await startBatch(contractor, site);
  await uploadPhotographs(
    contractor,
    batch,
    PLANNED.flatMap((one) => viewsOf(one).map((view) => `${one.structureNumber} ${view}.jpg`)),
  );
  await uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: mixedWorkbook(site.lot.number),
  });
}, 120_000);
afterAll(() => harness.close());

const decide = async (code: string, body: object): Promise<number> => {
  const [finding] = await findingsOf(inspector, batch, `&code=${code}`);
  const reply = await inspector
    .put(`/api/findings/${finding?.id}/decision`)
    .set('If-Match', `"${finding?.version}"`)
    .send(body);
  return reply.status;
};

describe('a batch of three kinds', () => {
  it('is checked line by line, each by the rules of its kind', async () => {
    const lines = await recordsOf(contractor, batch);
    expect(lines.map((line) => [line.structureNumber, line.kind, line.sheet, line.photos.length])).toEqual([
      ['S-1', 'set', 'Set', 4],
      ['S-2', 'set', 'Set', 4],
      ['T-1', 'straighten', 'Straighten', 4],
      ['T-2', 'straighten', 'Straighten', 4],
      ['P-1', 'relevel', 'Re-level', 4],
      ['P-2', 'relevel', 'Re-level', 4],
    ]);
    // WR-01: 8.6701 ft³; above: 1.725 ft³ with kits of both events, 3 ft³; 40 · 40 · 2 / 1728 = 1.8519 ft³.
    const fill = (structure: string) => {
      const derived = lines.find((line) => line.structureNumber === structure)?.derived;
      return [derived?.voidFt3, derived?.placedFt3, derived?.fillRatio];
    };
    for (const [structure, ...expected] of [
      ['S-1', 8.6701, 9.5, 1.0957],
      ['T-1', 1.725, 3, 1.7391],
      ['P-1', 1.8519, 2.5, 1.35],
    ] as const)
      expect(fill(structure)).toEqual(expected.map((figure) => expect.closeTo(figure, 4) as number));
    const found = await findingsOf(contractor, batch);
    expect(
      found.map((one) => [one.structureNumber, one.code, one.severity, one.measured, one.limit, one.sheet]),
    ).toEqual([
      ['S-2', 'embedment-short', 'nonconformity', 5.5, 6, 'Set'],
      ['T-2', 'lean-left', 'nonconformity', 1.4, 1, 'Straighten'],
      ['P-2', 'pad-slope', 'nonconformity', 0.3, 0.25, 'Re-level'],
    ]);
    // Lists narrow to a kind.
    expect((await recordsOf(inspector, batch, '&kind=straighten')).length).toBe(0);
    expect((await recordsOf(contractor, batch, '&kind=relevel')).map((line) => line.structureNumber)).toEqual(
      ['P-1', 'P-2'],
    );
  });

  it('shows of a record what its ± comes from, and how strong the foam was, event by event', async () => {
    const line = (await recordsOf(contractor, batch, '&structure=T-1'))[0];
    const sheet = (await contractor.get(`/api/records/${line?.id}`)).body;
    const rounded = (rows: Record<string, unknown>[], ...keys: string[]) =>
      rows.map((row) =>
        keys.map((key) => (typeof row[key] === 'number' ? Number(row[key].toFixed(3)) : row[key])),
      );
    // Gaps of 7.5 and 1.5 in, together: 2 · 0.125 / 9; width 0.1 / 11.5; depth 0.5 / 57.6; yield 3 %: squared, over their sum.
    expect(rounded(sheet.uncertainty, 'source', 'share')).toEqual([
      ['yield', 0.494],
      ['gap', 0.423],
      ['width', 0.041],
      ['depth', 0.041],
    ]);
    // Poured at 10:00 and released at 10:20: 0.5 + 0.3 · ln(20/3) / ln 20 = 0.690; reattached at 11:00: 0.8.
    expect(rounded(sheet.strength, 'event', 'field', 'minutes', 'share')).toEqual([
      [1, 'releasedAt', 20, 0.69],
      [1, 'reattachedAt', 60, 0.8],
      [2, 'releasedAt', 20, 0.69],
    ]);
  });

  it('is submitted, taken, decided: clean, on evidence, with a concession, returned', async () => {
    expect((await contractor.post(`${batch.path}/submit`)).body.status).toBe('submitted');
    expect((await inspector.post(`${batch.path}/take`)).body.status).toBe('in-review');
    expect((await inspector.post(`${batch.path}/approve-clean`)).body.approved).toBe(3);
    const [short] = await findingsOf(inspector, batch, '&code=embedment-short');
    const asked = await inspector
      .post(`/api/findings/${short?.id}/concession`)
      .send({ reason: 'Rock at 5.5 ft.' });
    expect(asked.status).toBe(201);
    expect(
      await decide('pad-slope', {
        decision: 'approve',
        grounds: 'evidence',
        reason: 'The level in the photograph reads 1/8 in.',
      }),
    ).toBe(200);
    expect(
      await decide('lean-left', {
        decision: 'reject',
        action: 'rework',
        reason: 'Pull it again.',
        dueOn: '2099-05-01',
      }),
    ).toBe(200);
    const closed = await inspector.post(`${batch.path}/close-review`);
    expect(closed.status).toBe(200);
    const engineer = await harness.signIn('engineer');
    const granted = await engineer
      .put(`/api/concessions/${asked.body.id}/decision`)
      .set('If-Match', `"${asked.body.version}"`)
      .send({ decision: 'grant', reason: 'Rock carries it.' });
    expect(granted.status).toBe(200);
    const states = Object.fromEntries(
      (await recordsOf(inspector, batch, '&revision=0')).map((line) => [line.structureNumber, line.state]),
    );
    expect(states).toEqual({
      'S-1': 'approved',
      'S-2': 'approved',
      'T-1': 'approved',
      'T-2': 'returned',
      'P-1': 'approved',
      'P-2': 'approved',
    });
  });

  it('goes on record, and the register narrows to a kind', async () => {
    const waiting = (await clerk.get('/api/register/candidates?limit=200')).body.items as { id: string }[];
    expect(waiting).toHaveLength(5);
    const recordIds = (await recordsOf(inspector, batch, '&revision=0'))
      .filter((line) => line.state === 'approved')
      .map((line) => line.id);
    const entered = await clerk.post('/api/register/entries').send({ recordIds });
    expect(entered.status).toBe(201);
    const kinds = async (query: string) =>
      (
        (await clerk.get(`/api/register?sort=structure&${query}`)).body.items as Record<string, unknown>[]
      ).map((row) => [
        row['structureNumber'],
        row['kind'],
        row['pole'],
        row['embedmentFt'],
        row['nonconforming'],
      ]);
    expect(await kinds('kind=straighten')).toEqual([['T-1', 'straighten', 'southern pine', 6, false]]);
    expect(await kinds('kind=relevel')).toEqual([
      ['P-1', 'relevel', null, null, false],
      ['P-2', 'relevel', null, null, false],
    ]);
    expect((await kinds('')).length).toBe(5);
  });

  it('is issued as a workbook that says what was handed in', async () => {
    const asked = await clerk
      .post('/api/transmittals')
      .send({ scope: { workOrder: site.order.id }, title: 'Three kinds' });
    expect(asked.status).toBe(202);
    await harness.drain();
    const file = await clerk.get(`/api/transmittals/${asked.body.id}/file`).responseType('blob');
    const book = read(file.body as Buffer);
    const rowsOf = (name: string) =>
      utils.sheet_to_json<Record<string, unknown>>(book.Sheets[name] as WorkSheet, { raw: true }).slice(2);

    expect(rowsOf('Set')).toMatchObject([
      { structureNumber: 'S-1', poleLengthFt: 40, boreTopIn: 20, embedmentFt: 6, dueFt: 6, conforms: 'yes' },
      {
        structureNumber: 'S-2',
        embedmentFt: 5.5,
        boreDepthFt: 6,
        conforms: 'no',
        concessions: 'C-0001',
        standard: 1,
      },
    ]);
    const straightened = rowsOf('Straighten');
    expect(straightened).toMatchObject([
      {
        structureNumber: 'T-1',
        poleMaterial: 'southern-pine',
        leanBeforeInPer10Ft: 11,
        leanBeforeAzimuthDeg: 90,
        leanAfterInPer10Ft: 0.2,
        gapAtGradeIn: 7.5,
        gapAtDepthIn: 1.5,
        gapDepthFt: 4.8,
        gapWidthIn: 11.5,
        voidFt3: expect.closeTo(1.725, 4),
        placedFt3: 3,
        conforms: 'yes',
        photographs: 4,
        batch: '17-01',
      },
    ]);
    // Excel serial of 2026-04-14 (1900 system): 46126; 09:30 are 570 of 1440 minutes.
    expect(straightened[0]?.['pulledAt']).toBeCloseTo(46126 + 570 / 1440, 6);
    expect(straightened[0]).not.toHaveProperty('dueFt');
    expect(rowsOf('Re-level')).toMatchObject([
      {
        structureNumber: 'P-1',
        padLengthIn: 40,
        padWidthIn: 40,
        gap1In: 2,
        gap2In: 2,
        gap3In: 2,
        gap4In: 2,
        slopeBeforeAlongInPerFt: 0.6,
        slopeAfterAlongInPerFt: 0,
        fillRatio: expect.closeTo(1.35, 4),
        conforms: 'yes',
      },
      { structureNumber: 'P-2', slopeAfterAcrossInPerFt: 0.3, conforms: 'yes' },
    ]);
    // Both kits of a pole are one pour, so their order says nothing.
    const pours = rowsOf('Pours').map((row) => POURED.map((key) => row[key]));
    expect(pours).toHaveLength(8);
    expect(pours).toEqual(
      expect.arrayContaining([
        ['P-1', 'relevel', 1, 'EP-15', 2.5, 1, 72, undefined, undefined],
        ['P-2', 'relevel', 1, 'EP-15', 2.5, 1, 72, undefined, undefined],
        ['S-1', 'set', 1, 'EP-15', 1.5, 1, 72, 55, 'warmed in the cab'],
        ['S-1', 'set', 1, 'EP-15', 8, 1, 72, 55, 'warmed in the cab'],
        ['S-2', 'set', 1, 'EP-15', 1.5, 1, 72, undefined, undefined],
        ['S-2', 'set', 1, 'EP-15', 8, 1, 72, undefined, undefined],
        ['T-1', 'straighten', 1, 'EP-15', 1.5, 1, 72, undefined, undefined],
        ['T-1', 'straighten', 2, 'EP-15', 1.5, 1, 72, undefined, undefined],
      ]),
    );
    const events = rowsOf('Events');
    expect(events).toMatchObject([
      { structureNumber: 'T-1', kind: 'straighten', event: 2, hardwareAt: 'not by us', notes: 'topped up' },
    ]);
    // 2026-04-21 is a week later: 46133; 09:50 are 590 of 1440 minutes.
    expect(events[0]?.['releasedAt']).toBeCloseTo(46133 + 590 / 1440, 6);
    expect(rowsOf('Findings')).toMatchObject([
      { structureNumber: 'P-2', code: 'pad-slope', measured: 0.3, limit: 0.25, grounds: 'evidence' },
      {
        structureNumber: 'S-2',
        code: 'embedment-short',
        measured: 5.5,
        limit: 6,
        grounds: 'concession',
        concession: 'C-0001',
      },
    ]);
    const cover = utils.sheet_to_json<unknown[]>(book.Sheets['Cover'] as WorkSheet, { header: 1 });
    expect(Object.fromEntries(cover.map(([key, , value]) => [key, value]))).toMatchObject({
      'count:Set': 2,
      'count:Straighten': 1,
      'count:Re-level': 2,
      'count:Pours': 8,
      'count:Events': 1,
      'count:Findings': 2,
      nonconforming: 1,
    });
  });
});

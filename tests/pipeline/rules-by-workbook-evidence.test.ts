import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { photographWithHash } from '#tests/factories/photo-facts.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { placeOf } from '#tests/factories/place.ts';
import { pourRow, pourRows, setRow } from '#tests/factories/set-row.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { findingsOf, startBatch, uploadWorkbook, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';
import { createOnRecord } from './on-record.ts';

/** Rules on photographs, on the register and on what earlier checks said: each fails once and passes once. */

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
const RECORDED = 'ON-RECORD-1';
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['A-1', 'A-2', 'A-3', 'A-4', 'A-5', 'A-6', 'B-1'] });
  contractor = await harness.signIn(site.contractor);
});
afterAll(() => harness.close());

const upload = async (batch: HandedIn, files: readonly (readonly [string, Buffer])[]) => {
  const form = contractor.post(`${batch.path}/photos`);
  for (const [name, bytes] of files) form.attach('photos', bytes, name);
  expect((await form).status).toBe(202);
  // Their facts are known when the workbook's check comes.
  await harness.drain();
};
const check = async (
  batch: HandedIn,
  set: readonly ReturnType<typeof setRow>[],
  pours?: ReturnType<typeof pourRows>,
) => {
  const names = set.map((row) => String(row['structureNumber']));
  await uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: { set, pours: pours ?? names.flatMap((name) => pourRows(name, site.lot.number)) },
  });
  return (await findingsOf(contractor, batch)).filter(({ code }) => code !== 'photo-missing');
};
const codes = (findings: readonly FindingRow[]) =>
  findings.map(({ code, structureNumber }) => `${structureNumber} ${code}`);
const minute = (minutes: string) => ({
  IFD2: { DateTimeOriginal: `2026:04:14 ${minutes}:00`, OffsetTimeOriginal: '-05:00' },
});
/** Degrees to EXIF's rationals of degrees alone. */
const at = (latitude: number, longitude: number) => ({
  IFD3: {
    GPSLatitudeRef: 'N',
    GPSLatitude: `${Math.round(latitude * 1e6)}/1000000 0/1 0/1`,
    GPSLongitudeRef: 'W',
    GPSLongitude: `${Math.round(-longitude * 1e6)}/1000000 0/1 0/1`,
  },
});

describe('photographs', () => {
  it('taken at another time or place, undated or small are found, and those that are not are not', async () => {
    const { latitude, longitude } = placeOf('A-1');
    const batch = await startBatch(contractor, site);
    // Bored at 09:00; loaded the next morning at 08:00. Half an hour before the first is 08:30.
    await upload(batch, [
      ['A-1 bore-depth.jpg', await photograph({ exif: minute('08:29') })],
      ['A-1 kits.jpg', await photograph({ exif: at(latitude + 0.001, longitude) })],
      ['A-1 finish.jpg', await photograph({ exif: { IFD2: {} } })],
      ['A-1 plumb.jpg', await photograph({ width: 999, height: 700 })],
      ['A-2 bore-depth.jpg', await photograph({ exif: minute('08:30') })],
      ['A-2 kits.jpg', await photograph({ exif: at(placeOf('A-2').latitude, placeOf('A-2').longitude) })],
      ['A-2 finish.jpg', await photograph()],
      ['A-2 plumb.jpg', await photograph({ width: 1000, height: 700 })],
    ]);
    const found = await check(batch, [setRow('A-1'), setRow('A-2')]);
    expect(codes(found).toSorted()).toEqual([
      'A-1 photo-elsewhen',
      'A-1 photo-elsewhere',
      'A-1 photo-small',
      'A-1 photo-undated',
    ]);
    const of = (code: string) => found.find((one) => one.code === code);
    expect(of('photo-elsewhen')).toMatchObject({
      measured: '2026-04-14T08:29',
      limit: '2026-04-14T09:00',
      margin: -1,
      severity: 'query',
    });
    // 0.001° of latitude are some 364 ft.
    expect(of('photo-elsewhere')).toMatchObject({ limit: 150, unit: 'ft', severity: 'query' });
    expect(of('photo-elsewhere')?.measured).toBeCloseTo(364.4, 0);
    expect(of('photo-small')).toMatchObject({ measured: 999, limit: 1000, margin: -1, severity: 'note' });
    expect(of('photo-undated')).toMatchObject({ measured: 'A-1 finish.jpg', severity: 'note' });
  });

  it('reused from another batch are found', async () => {
    const [twice, once] = [await photograph(), await photograph()];
    const first = await startBatch(contractor, site);
    await upload(first, [['A-3 finish.jpg', twice]]);
    await check(first, [setRow('A-3')]);
    const second = await startBatch(contractor, site);
    await upload(second, [
      ['A-4 finish.jpg', twice],
      ['A-5 finish.jpg', once],
    ]);
    const found = await check(second, [setRow('A-4'), setRow('A-5')]);
    expect(codes(found)).toEqual(['A-4 photo-reused']);
    expect(found).toMatchObject([{ severity: 'nonconformity', measured: 'A-4 finish.jpg' }]);
    expect(found[0]?.message).toContain('A-3');
  });

  it('alike by their hashes are found', async () => {
    const facts = (phash: string) => photographWithHash(harness.em(), { phash });
    const batch = await startBatch(contractor, site);
    // Six bits are alike, seven are not: 0xcf and 0x8f against 0xf0.
    await upload(batch, [
      ['A-1 finish.jpg', await facts('aaaaaaaaaaaaaaf0')],
      ['A-2 finish.jpg', await facts('aaaaaaaaaaaaaacf')],
      ['A-3 plumb.jpg', await facts('5555aaaa5555aaf0')],
      ['A-4 plumb.jpg', await facts('5555aaaa5555aa8f')],
    ]);
    const found = await check(
      batch,
      ['A-1', 'A-2', 'A-3', 'A-4'].map((name) => setRow(name)),
    );
    expect(codes(found)).toEqual(['A-1 photo-alike', 'A-2 photo-alike']);
    expect(found).toMatchObject([{ severity: 'query', params: { bits: 6, other: 'A-2' } }, {}]);
  });
});

describe('the register', () => {
  it('already holds the structure, unless the line says that it replaces it', async () => {
    await createOnRecord(harness, { structureNumber: RECORDED, latitude: 41, longitude: -98 });
    const batch = await startBatch(contractor, site);
    const found = await check(batch, [setRow(RECORDED), setRow('A-6')]);
    const own = found.filter(({ code }) => code === 'already-on-record');
    expect(codes(own)).toEqual([`${RECORDED} already-on-record`]);
    // Another contractor's: which record it is is for the owner alone.
    expect(JSON.stringify(own)).not.toContain(`R-${RECORDED}`);
    const again = await check(batch, [setRow(RECORDED, { replacesStructure: RECORDED }), setRow('A-6')]);
    expect(codes(again)).not.toContain(`${RECORDED} already-on-record`);
  });
});

describe('a value changed between two checks', () => {
  it('so that a rule passes is a query with both values, at every later check too', async () => {
    const batch = await startBatch(contractor, site);
    const early = { hardwareAt: '2026-04-14T10:09' };
    expect(codes(await check(batch, [setRow('B-1', early), setRow('A-1')]))).toEqual(['B-1 hardware-early']);
    const found = await check(batch, [setRow('B-1'), setRow('A-1', { notes: 'nothing measured' })]);
    expect(codes(found)).toEqual(['B-1 changed-to-pass']);
    expect(found).toMatchObject([
      { severity: 'query', field: 'hardwareAt', measured: '2026-04-14T11:00', limit: null },
    ]);
    expect(found[0]?.message).toContain('2026-04-14 10:09');
    await upload(batch, [['B-1 finish.jpg', await photograph()]]);
    expect(
      codes((await findingsOf(contractor, batch)).filter(({ code }) => code !== 'photo-missing')),
    ).toEqual(['B-1 changed-to-pass']);
  });

  it('kits too', async () => {
    const batch = await startBatch(contractor, site);
    const one = [pourRow('B-1', site.lot.number)];
    expect(codes(await check(batch, [setRow('B-1')], one))).toEqual(['B-1 fill-short']);
    const found = await check(batch, [setRow('B-1')]);
    expect(found).toMatchObject([
      { code: 'changed-to-pass', sheet: 'Pours', field: 'quantity', measured: 1 },
    ]);
  });
});

describe('a rule that is off until a later version of the standard', () => {
  it('brand-differs: judged on the work day', async () => {
    const [author, approver] = [await harness.person('engineer'), await harness.person('engineer')];
    const brand = { ...DEMO_STANDARD.rules['brand-differs'], on: true };
    await createStandard(harness.em(), {
      authorId: author.id,
      approverId: approver.id,
      effectiveOn: '2026-05-01',
      body: { ...DEMO_STANDARD, rules: { ...DEMO_STANDARD.rules, 'brand-differs': brand } },
    });
    const inMay = <T extends object>(row: T): T =>
      JSON.parse(JSON.stringify(row).replaceAll('"2026-04-', '"2026-05-')) as T;
    const batch = await startBatch(contractor, site);
    // A 40 ft pole is branded 10 ft from the butt: 10 − 5.4 = 4.6 ft in the ground where 6 ft are written down.
    const found = await check(
      batch,
      [
        inMay(setRow('A-1', { brandHeightFt: 5.4 })),
        inMay(setRow('A-2', { brandHeightFt: 3.5 })),
        setRow('A-3', { brandHeightFt: 5.4 }),
      ],
      [
        ...['A-1', 'A-2'].flatMap((name) => pourRows(name, site.lot.number).map(inMay)),
        ...pourRows('A-3', site.lot.number),
      ],
    );
    expect(codes(found)).toEqual(['A-1 brand-differs']);
    expect(found).toMatchObject([{ limit: 0.5, unit: 'ft', severity: 'query', field: 'brandHeightFt' }]);
    expect(found[0]?.measured).toBeCloseTo(1.4, 9);
    expect(found[0]?.margin).toBeCloseTo(-0.9, 9);
  });
});

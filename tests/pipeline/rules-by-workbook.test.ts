import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import type { Kind } from '#shared/records/types.ts';
import { createLot } from '#tests/factories/foam.ts';
import { startBatch, uploadPhotographs, uploadWorkbook } from '#tests/factories/start-batch.ts';
import { pourRow, pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';
import { createOnRecord } from './on-record.ts';
import { AREA, TAKEN_PLACE, poursOf, rowOf, type Expected, LOT } from './rule-case.ts';
import { createOtherFoam } from './other-foam.ts';
import { CONTEXT_CASES } from './rule-cases-context.ts';
import { MEASURE_CASES } from './rule-cases-measures.ts';
import { TIME_CASES } from './rule-cases-times.ts';
import { RULE_CASES } from './rule-cases.ts';

const CASES = [...RULE_CASES, ...MEASURE_CASES, ...TIME_CASES, ...CONTEXT_CASES].map((one, index) => ({
  kind: 'set' as Kind,
  ...one,
  bad: `F-${index + 1}`,
  good: `P-${index + 1}`,
}));
const linesOf = (kind: Kind) =>
  CASES.filter((one) => one.kind === kind).flatMap(({ bad, good, fails, passes }) => [
    rowOf(bad, kind, fails),
    rowOf(good, kind, passes),
  ]);
const TWICE = 'T-1';
const UNPLANNED = 'U-1';
const PHOTOGRAPHED = 'V-1';
const PARTLY = 'V-2';

let harness: Harness;
let findings: FindingRow[];
const on = (structure: string) => findings.filter((one) => one.structureNumber === structure);
/** Photographs are handed in for two lines only; each other line lacks its four. */
const codesOn = (structure: string) =>
  on(structure).flatMap((one) => (one.code === 'photo-missing' ? [] : [one.code]));

/** A ratio is worked out to four places. */
const near = (expected: Expected) =>
  Object.fromEntries(
    Object.entries(expected).map(([key, value]) => [
      key,
      typeof value === 'number' ? expect.closeTo(value, 4) : value,
    ]),
  );

beforeAll(async () => {
  harness = await createHarness();
  const cases = CASES.flatMap(({ kind, bad, good, fails, passes }) => [
    { kind, structureNumber: bad, design: fails.planned ?? {} },
    { kind, structureNumber: good, design: passes.planned ?? {} },
  ]);
  const site = await createWorkSite(harness, { planned: [...cases, TWICE, PHOTOGRAPHED, PARTLY] });
  await createLot(harness.em(), { productId: site.product.id, number: LOT });
  await createOtherFoam(harness.em(), site.product.id);
  await run(harness.em(), 'update work_orders set area = $2 where id = $1', [
    site.order.id,
    JSON.stringify(AREA),
  ]);
  await createOnRecord(harness, { structureNumber: 'ELSEWHERE-1', ...TAKEN_PLACE });
  const contractor = await harness.signIn(site.contractor);
  const batch = await startBatch(contractor, site);
  await uploadPhotographs(contractor, batch, [
    ...SET_VIEWS.map((view) => `${PHOTOGRAPHED} ${view}.jpg`),
    ...SET_VIEWS.filter((view) => view !== 'plumb').map((view) => `${PARTLY} ${view}.jpg`),
  ]);
  await uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: [
        ...linesOf('set'),
        setRow(TWICE),
        setRow(TWICE, { setAt: '2026-04-14T09:45' }),
        setRow(UNPLANNED),
        setRow(PHOTOGRAPHED),
        setRow(PARTLY),
      ],
      straighten: linesOf('straighten'),
      relevel: linesOf('relevel'),
      pours: [
        ...CASES.flatMap(({ kind, bad, good, fails, passes }) => [
          ...poursOf(bad, kind, fails),
          ...poursOf(good, kind, passes),
        ]),
        ...[TWICE, UNPLANNED, PHOTOGRAPHED, PARTLY].flatMap((structure) => pourRows(structure, LOT)),
        pourRow('X-404', LOT),
      ],
    },
  });
  findings = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const query: string = cursor === '' ? '' : `&cursor=${cursor}`;
    const page = await contractor.get(`${batch.path}/findings?limit=200${query}`);
    findings.push(...page.body.items);
    cursor = page.body.nextCursor;
  }
}, 120_000);
afterAll(() => harness.close());

describe('every rule through an uploaded workbook', () => {
  it.each(CASES)('$code is found where it is not met, and alone', ({ code, bad, fails, onBatch = false }) => {
    expect(codesOn(bad)).toEqual(onBatch ? [] : [code]);
    const [found, ...more] = findings.filter(
      (one) => one.code === code && (onBatch ? one.recordId === null : one.structureNumber === bad),
    );
    expect(more).toEqual([]);
    expect(found).toMatchObject({ severity: 'nonconformity', ...near(fails.expected) });
  });

  it.each(CASES)('$code is not found where it is met', ({ good }) => {
    expect(codesOn(good)).toEqual([]);
  });

  it('pour-orphan: a pour of a structure without a line belongs to the batch', () => {
    expect(findings.filter((one) => one.code === 'pour-orphan')).toMatchObject([
      {
        recordId: null,
        severity: 'nonconformity',
        sheet: 'Pours',
        measured: 'X-404',
        limit: null,
        margin: null,
      },
    ]);
  });

  it('not-on-order: a structure that is not planned, and none that is', () => {
    expect(codesOn(UNPLANNED)).toEqual(['not-on-order']);
    expect(findings.filter((one) => one.code === 'not-on-order')).toMatchObject([{ measured: UNPLANNED }]);
  });

  it('done-twice: the second line of a structure', () => {
    // Two lines where one may be: 1 − 2 = −1.
    expect(findings.filter((one) => one.code === 'done-twice')).toMatchObject([
      { structureNumber: TWICE, measured: 2, limit: 1, margin: -1, unit: 'count' },
    ]);
  });

  it('photo-missing: the one view that is lacking, and none where all are there', () => {
    expect(on(PARTLY).map((one) => [one.code, one.limit])).toEqual([['photo-missing', 'plumb']]);
    expect(on(PHOTOGRAPHED)).toEqual([]);
    // Nothing recorded in the way of water asks for no picture of it.
    expect(new Set(on('P-1').map((one) => one.limit))).toEqual(new Set(SET_VIEWS));
  });

  it('says each in words, with its remedy', () => {
    for (const one of findings) {
      expect(one.title).not.toBe('Finding');
      expect(one.message).toMatch(/^\S.*[.!?]$/u);
      expect(one.remedy).toMatch(/^\S.*\.$/u);
    }
  });
});

import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { RowInput } from '#server/workbook/write-workbook.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';
import { relevelRow, repairPours, straightenRow } from '#tests/factories/repair-rows.ts';
import { pourRow, pourRows, setRow } from '#tests/factories/set-row.ts';
import { recordsOf, startBatch, uploadWorkbook } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';
import { LOT, type BadRecord } from './bad-record.ts';
import { BAD_RECORDS } from './bad-records.ts';

/** What cannot be, or hardly, through an uploaded workbook: each a finding with its cell and what to do; the rest is judged all the same. */

let harness: Harness;
let findings: readonly FindingRow[];
let records: readonly RecordRow[];

const ROW = { set: setRow, straighten: straightenRow, relevel: relevelRow };
const rows = (kind: BadRecord['kind']) =>
  BAD_RECORDS.filter((one) => one.kind === kind).map((one) => ROW[one.kind](one.structure, one.values));
const pours = ({ kind, structure, pours: own }: BadRecord): readonly RowInput[] => {
  if (own) return own.map((values) => pourRow(structure, LOT, values));
  return kind === 'set' ? pourRows(structure, LOT) : repairPours(structure, LOT, { kind });
};

beforeAll(async () => {
  harness = await createHarness();
  const site: WorkSite = await createWorkSite(harness, {
    planned: BAD_RECORDS.map(({ structure: structureNumber, kind, planned = {} }) => ({
      structureNumber,
      kind,
      design: planned,
    })),
  });
  const contractor = await harness.signIn(site.contractor);
  const batch = await startBatch(contractor, site);
  await uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: rows('set'),
      straighten: rows('straighten'),
      relevel: rows('relevel'),
      pours: BAD_RECORDS.flatMap(pours).map((row) => ({ ...row, lot: site.lot.number })),
    },
  });
  const all: FindingRow[] = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const query: string = cursor === '' ? '' : `&cursor=${cursor}`;
    const page = await contractor.get(`${batch.path}/findings?limit=200${query}`);
    all.push(...page.body.items);
    cursor = page.body.nextCursor;
  }
  // No photograph is handed in here.
  findings = all.filter((one) => one.code !== 'photo-missing');
  records = await recordsOf(contractor, batch);
}, 120_000);
afterAll(() => harness.close());

describe('what cannot be', () => {
  it.each(BAD_RECORDS)('$what', ({ structure, finds, figures }) => {
    const found = findings.filter((one) => one.structureNumber === structure);
    expect(found.map((one) => `${one.severity} ${one.code} ${one.sheet}!${one.field}`).toSorted()).toEqual(
      finds.map((one) => `${one.severity ?? 'nonconformity'} ${one.code} ${one.at}`).toSorted(),
    );
    for (const { code, at, ...expected } of finds) {
      const { says = [], severity: _severity, ...facts } = expected;
      const same = found.filter((one) => one.code === code && `${one.sheet}!${one.field}` === at);
      for (const one of same) {
        expect(one).toMatchObject(facts);
        expect(one.cell).toMatch(/^[A-Z]{1,2}\d{1,3}$/u);
        expect(one.remedy).toMatch(/^\S.*\.$/u);
        for (const words of says) expect(`${one.message} ${one.remedy}`).toContain(words);
      }
    }
    // To four places, as the figures beside the records are worked out.
    const derived = records.find((one) => one.structureNumber === structure)?.derived ?? {};
    const computed = Object.entries(derived).map(([figure, value]) => [
      figure,
      typeof value === 'number' ? Math.round(value * 1e4) / 1e4 : value,
    ]);
    expect(Object.fromEntries(computed)).toMatchObject(figures ?? {});
  });
});

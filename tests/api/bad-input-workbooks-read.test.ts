import type ExcelJS from 'exceljs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { findingsOf, type HandedIn, recordsOf, startBatch } from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { inFirstTemplate } from '#tests/fixtures/workbooks/earlier-template.ts';
import { cellOf, columnOf, edited, sheetOf } from '#tests/fixtures/workbooks/edited.ts';
import { type Agent, createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let good: Buffer;
let plain: Checked;

type Checked = {
  readonly batch: HandedIn;
  readonly findings: readonly FindingRow[];
  readonly records: readonly RecordRow[];
  /** The one finding of a code. */
  readonly found: (code: string) => FindingRow | undefined;
};

/** Uploads to a batch of its own, waits for the check, and gives what it said but for the photographs, which none has. */
async function check(bytes: Buffer): Promise<Checked> {
  const batch = await startBatch(contractor, site);
  const reply = await contractor.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
  expect(reply.status).toBe(202);
  await harness.drain();
  expect((await contractor.get(`${batch.path}/check`)).body).toMatchObject({ state: 'done', problem: null });
  const findings = (await findingsOf(contractor, batch)).filter((one) => one.code !== 'photo-missing');
  const records = await recordsOf(contractor, batch);
  return { batch, findings, records, found: (code) => findings.find((one) => one.code === code) };
}

const changed = async (change: (workbook: ExcelJS.Workbook) => void): Promise<Checked> =>
  check(await edited(good, change));
const codes = (checked: Checked): string[] => checked.findings.map((one) => one.code).toSorted();
const values = (checked: Checked) => checked.records.map((record) => record.values);

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  good = await workbookFile({
    workOrder: site.order.number,
    set: [setRow('L-1')],
    pours: pourRows('L-1', site.lot.number),
  });
  plain = await check(good);
});
afterAll(() => harness.close());

it('a workbook as it should be gives nothing to say', () => {
  expect(plain.findings).toEqual([]);
  expect(plain.records).toMatchObject([{ structureNumber: 'L-1', values: { embedmentFt: 6 } }]);
});

describe('a template', () => {
  it('of another work order is named on the Batch sheet, with both numbers', async () => {
    const checked = await changed((workbook) => {
      sheetOf(workbook, 'Batch').getCell('C1').value = 'WO-17';
      workbook.keywords = 'template=2; workOrder=WO-17';
    });
    expect(codes(checked)).toEqual(['workbook-other-order']);
    expect(checked.found('workbook-other-order')).toMatchObject({
      severity: 'nonconformity',
      sheet: 'Batch',
      cell: 'C1',
      message: `The workbook says that it is for work order “WO-17”; this batch belongs to ${site.order.number}.`,
      remedy: expect.stringMatching(/copy the rows into this order’s template/u),
    });
  });

  it('of an earlier version reads the same, with a note', async () => {
    const checked = await check(await inFirstTemplate(good));
    expect(codes(checked)).toEqual(['workbook-template-old']);
    expect(checked.found('workbook-template-old')).toMatchObject({
      severity: 'note',
      sheet: 'Batch',
      cell: 'C4',
      message: expect.stringMatching(/version 1; version 2 is current/u),
      remedy: expect.stringMatching(/current template for the next batch/u),
    });
    expect(values(checked)).toEqual(values(plain));
  });
});

describe('a sheet', () => {
  it('of another name is named with the name that it should have', async () => {
    const checked = await changed((workbook) => {
      sheetOf(workbook, 'Set').name = 'Poles';
    });
    expect(checked.records).toEqual([]);
    expect(checked.found('workbook-sheet-renamed')).toMatchObject({
      severity: 'nonconformity',
      sheet: 'Poles',
      message: expect.stringMatching(/“Poles” has the headings of Set/u),
      remedy: expect.stringMatching(/name it Set again/u),
    });
  });

  it('that is no part of the template is named and does no harm', async () => {
    const checked = await changed((workbook) => {
      workbook.addWorksheet('Holiday').addRow(['Ann', 'May']);
    });
    expect(codes(checked)).toEqual(['workbook-sheet-unknown']);
    expect(checked.found('workbook-sheet-unknown')).toMatchObject({ severity: 'note', sheet: 'Holiday' });
    expect(values(checked)).toEqual(values(plain));
  });
});

describe('columns', () => {
  /** The heading of a column in a workbook whose row of keys is gone. */
  const titled = (workbook: ExcelJS.Workbook, title: string): ExcelJS.Cell => {
    const sheet = sheetOf(workbook, 'Set');
    for (let column = 1; column <= sheet.columnCount; column++) {
      const cell = sheet.getRow(1).getCell(column);
      if (cell.text === title) return cell;
    }
    throw new Error(`There is no title ${title}.`);
  };
  const withoutKeys = async (change: (workbook: ExcelJS.Workbook) => void): Promise<Checked> => {
    const bytes = await workbookFile({
      workOrder: site.order.number,
      set: [setRow('L-1')],
      pours: pourRows('L-1', site.lot.number),
      keys: false,
    });
    return check(await edited(bytes, change));
  };

  it('that were moved and retitled read the same while their keys stand', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      const [from, to] = [columnOf(sheet, 'embedmentFt'), sheet.columnCount + 1];
      for (const row of [1, 3, 4])
        sheet.getRow(row).getCell(to).value = sheet.getRow(row).getCell(from).value;
      sheet.getRow(2).getCell(to).value = 'How deep it stands';
      sheet.spliceColumns(from, 1);
    });
    expect(checked.findings).toEqual([]);
    expect(values(checked)).toEqual(values(plain));
  });

  it('go by their titles in any letters where the keys are gone; a title that nobody knows is named', async () => {
    const checked = await withoutKeys((workbook) => {
      titled(workbook, 'Bore depth (ft)').value = 'BORE  depth';
      titled(workbook, 'Embedment (ft)').value = 'How deep';
    });
    expect(codes(checked)).toEqual(['record-missing', 'workbook-column-missing', 'workbook-column-unknown']);
    expect(values(checked)).toMatchObject([{ boreDepthFt: 6 }]);
    // Embedment is the 29th field of the sheet.
    expect(checked.found('workbook-column-unknown')).toMatchObject({
      sheet: 'Set',
      cell: 'AC1',
      message: expect.stringMatching(/^Column AC of Set, “How deep”, is no part of the template/u),
    });
  });

  it('that every line needs are missed by name, and so is what they would hold', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      for (const key of ['structureNumber', 'embedmentFt']) sheet.spliceColumns(columnOf(sheet, key), 1);
    });
    const missing = checked.findings.filter((one) => one.code === 'workbook-column-missing');
    expect(missing.map((one) => one.sheet)).toEqual(['Set', 'Set']);
    expect(missing.map((one) => one.message).toSorted()).toEqual([
      'The sheet Set has no column “Embedment”.',
      'The sheet Set has no column “Structure number”.',
    ]);
    expect(missing[0]?.remedy).toBe('Bring the column back from the template and fill it in.');
    const fields = checked.findings
      .filter((one) => one.code === 'record-missing')
      .map((one) => [one.field, one.row]);
    expect(fields).toEqual(
      expect.arrayContaining([
        ['structureNumber', 4],
        ['embedmentFt', 4],
      ]),
    );
    // Nothing was guessed in their place, and the pours without a line are told too.
    expect(values(checked)[0]).not.toHaveProperty('embedmentFt');
    expect(codes(checked)).toContain('pour-orphan');
  });

  it('headed __proto__ or constructor are kept as written and change nothing', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      const next = sheet.columnCount + 1;
      for (const [index, name] of ['__proto__', 'constructor'].entries()) {
        for (const row of [1, 2]) sheet.getRow(row).getCell(next + index).value = name;
        sheet.getRow(4).getCell(next + index).value = 'embedmentFt';
      }
    });
    const unknown = checked.findings.filter((one) => one.code === 'workbook-column-unknown');
    expect(unknown.map((one) => one.message).toSorted()).toEqual([
      expect.stringMatching(/“__proto__”, is no part of the template; it is kept as written/u),
      expect.stringMatching(/“constructor”, is no part of the template; it is kept as written/u),
    ]);
    expect(values(checked)).toEqual(values(plain));
    expect(Object.hasOwn(Object.prototype, 'embedmentFt')).toBe(false);
  });
});

describe('rows', () => {
  it('of one structure twice are both kept, and the second is named with its cell', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      sheet.addRow(sheet.getRow(4).values);
    });
    expect(checked.records.map((one) => [one.structureNumber, one.row])).toEqual([
      ['L-1', 4],
      ['L-1', 5],
    ]);
    expect(checked.found('done-twice')).toMatchObject({
      cell: 'A5',
      message: 'Structure L-1 stands 2 times on this sheet.',
      remedy: expect.stringMatching(/Leave one line a structure/u),
    });
  });

  it('with nothing but what the template filled in are no lines', async () => {
    const checked = await check(
      await workbookFile({
        workOrder: site.order.number,
        set: ['L-1', 'L-2'].map((structureNumber) => ({
          structureNumber,
          poleLengthFt: 40,
          poleClass: '4',
          poleMaterial: 'southern-pine',
        })),
      }),
    );
    expect(checked.records).toEqual([]);
    expect(codes(checked)).toEqual(['workbook-no-lines']);
    expect(checked.found('workbook-no-lines')).toMatchObject({
      severity: 'nonconformity',
      message: expect.stringMatching(/nothing but what the template had filled in is not one/u),
      remedy: 'Fill in what was measured, save, and upload again.',
    });
    expect((await contractor.post(`${checked.batch.path}/submit`)).status).toBe(409);
  });
});

describe('cells', () => {
  it('of formulas with errors, or without a stored result, are told by address and never a number', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      cellOf(sheet, 4, 'embedmentFt').value = { formula: '1/0', result: { error: '#DIV/0!' } };
      cellOf(sheet, 4, 'boreDepthFt').value = { formula: 'B4*2' };
      cellOf(sheet, 4, 'boreTopIn').value = { formula: '2*10', result: 20 };
    });
    const told = checked.findings.filter((one) => one.code === 'record-formula');
    const places = told.map((one) => `${one.cell} ${one.field} ${one.severity}`);
    expect(places.toSorted()).toEqual(['AC4 embedmentFt nonconformity', 'U4 boreDepthFt nonconformity']);
    const said = (cell: string) => told.find((one) => one.cell === cell);
    expect(said('AC4')?.message).toBe(
      'Cell AC4 (Embedment) holds a formula that ends in an error, #DIV/0!, and no reading.',
    );
    expect(said('AC4')?.remedy).toMatch(/^Write in .*AC4 a length in feet/u);
    expect(said('U4')?.message).toBe('Cell U4 (Bore depth) holds a formula whose result was never stored.');
    expect(said('U4')?.remedy).toMatch(/^Open the workbook in a spreadsheet program, save it there/u);
    const [record] = values(checked);
    expect(record).toMatchObject({ boreTopIn: 20 });
    expect(record).not.toHaveProperty('embedmentFt');
    expect(record).not.toHaveProperty('boreDepthFt');
  });

  it('that are merged are told by their range; the value is that of the first', async () => {
    const checked = await changed((workbook) => {
      const sheet = sheetOf(workbook, 'Set');
      sheet.addRow(sheet.getRow(4).values);
      cellOf(sheet, 5, 'structureNumber').value = 'L-2';
      const column = columnOf(sheet, 'locateTicket');
      sheet.mergeCells(4, column, 5, column);
    });
    expect(checked.found('workbook-merged')).toMatchObject({
      sheet: 'Set',
      message: expect.stringMatching(/^The cells [A-Z]+4:[A-Z]+5 of Set are merged: only the first/u),
      remedy: expect.stringMatching(/^Unmerge them and write the value in every row/u),
    });
    const tickets = values(checked).map((record) => record['locateTicket']);
    expect(tickets).toEqual(['LT-1', undefined]);
  });

  it('with times are the same in both date systems', async () => {
    const checked = await changed((workbook) => {
      workbook.properties.date1904 = true;
    });
    expect(checked.findings).toEqual([]);
    expect(values(checked)).toMatchObject([{ setAt: '2026-04-14T09:40', locateFrom: '2026-04-10' }]);
    expect(values(checked)).toEqual(values(plain));
  });
});

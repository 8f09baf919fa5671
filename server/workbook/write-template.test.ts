import { Writable } from 'node:stream';
import ExcelJS from 'exceljs';
import { describe, expect, it } from 'vitest';
import { readSource } from '#shared/workbook/read-source.ts';
import { readWorkbookBytes } from './read-workbook-bytes.ts';
import type { TemplateInput } from './template-types.ts';
import { writeTemplate } from './write-template.ts';

const INPUT: TemplateInput = {
  workOrder: { number: 'WO-7; b', title: 'Feeder 12 & taps', zone: 'America/Chicago' },
  contractor: 'Pike Line',
  owner: 'Larkmoor Electric Cooperative',
  standardNumber: 3,
  products: [{ code: 'EP-15', kitsFt3: [1.5, 4] }],
  lots: [{ number: 'L-100' }, { number: 'L-101' }],
  design: [
    {
      structureNumber: '4471/12',
      kind: 'set',
      poleLengthFt: 45,
      poleClass: '3',
      poleMaterial: 'southern-pine',
      ground: 'soil',
    },
    {
      structureNumber: '=1+1',
      kind: 'set',
      poleLengthFt: 40,
      poleClass: 'H1',
      poleMaterial: 'douglas-fir',
      ground: null,
    },
    { structureNumber: 'P-9', kind: 'relevel', padLengthIn: 44, padWidthIn: 40 },
  ],
};

async function template(): Promise<Buffer> {
  const chunks: Buffer[] = [];
  const sink = new Writable({
    write: (chunk: Buffer, _, next) => {
      chunks.push(chunk);
      next();
    },
  });
  await writeTemplate(sink, INPUT);
  return Buffer.concat(chunks);
}

/** Column of a sheet by its key in row 1. */
function columnOf(sheet: ExcelJS.Worksheet, key: string): number {
  const keys = sheet.getRow(1).values as unknown[];
  return keys.indexOf(key);
}

describe('the template', { timeout: 30_000 }, () => {
  it('as handed out holds no line and raises no notice but that', async () => {
    const source = readSource(await readWorkbookBytes(await template()));
    expect(source.batch.values).toEqual({
      workOrder: 'WO-7; b',
      contractor: 'Pike Line',
      templateVersion: '2',
    });
    expect(source.lines).toEqual([]);
    expect(source.notices.map((one) => one.code)).toEqual(['workbook-no-lines']);
  });

  it('filled in and saved by a spreadsheet program reads back', async () => {
    const workbook = new ExcelJS.Workbook();
    await workbook.xlsx.load((await template()).buffer as ArrayBuffer);
    const set = workbook.getWorksheet('Set')!;
    const fill = (row: number, values: Readonly<Record<string, ExcelJS.CellValue>>): void => {
      for (const [key, value] of Object.entries(values))
        set.getRow(row).getCell(columnOf(set, key)).value = value;
    };
    fill(4, {
      boreTopIn: 20,
      boreDepthFt: `6' 9"`,
      waterIn: '1 1/2',
      setAt: new Date(Date.UTC(2026, 3, 14, 10, 24)),
      letGoAt: '2026-04-14 10:40',
      loadAt: 'not yet',
    });
    workbook.getWorksheet('Batch')!.getCell('C4').value = 'Jo Marsh';
    const source = readSource(await readWorkbookBytes(Buffer.from(await workbook.xlsx.writeBuffer())));
    expect(source.batch.values['foreman']).toBe('Jo Marsh');
    expect(source.lines).toHaveLength(1);
    expect(source.lines[0]?.values).toEqual({
      structureNumber: '4471/12',
      poleLengthFt: 45,
      poleClass: '3',
      poleMaterial: 'southern-pine',
      ground: 'soil',
      boreTopIn: 20,
      boreDepthFt: 6.75,
      waterIn: 1.5,
      setAt: '2026-04-14T10:24',
      letGoAt: '2026-04-14T10:40',
      loadAt: 'not-yet',
    });
    expect(source.notices).toEqual([]);
  });

  it('guides: hidden keys, marked titles with units, hints, panes that stay, drop-downs from hidden lists', async () => {
    const workbook = new ExcelJS.Workbook();
    await workbook.xlsx.load((await template()).buffer as ArrayBuffer);
    expect(workbook.worksheets.map((sheet) => [sheet.name, sheet.state])).toEqual([
      ['Guide', 'visible'],
      ['Batch', 'visible'],
      ['Set', 'visible'],
      ['Straighten', 'visible'],
      ['Re-level', 'visible'],
      ['Pours', 'visible'],
      ['Events', 'visible'],
      ['Photos', 'visible'],
      ['Lists', 'hidden'],
    ]);
    const set = workbook.getWorksheet('Set')!;
    expect(set.getRow(1).hidden).toBe(true);
    expect(set.getRow(2).getCell(columnOf(set, 'boreDepthFt')).value).toBe('Bore depth (ft) *');
    expect(set.getRow(2).getCell(columnOf(set, 'leastGapIn')).value).toBe('Least gap (in)');
    expect(set.getRow(3).getCell(columnOf(set, 'boreTopIn')).value).toBe('Diameter at grade.');
    expect(set.views[0]).toMatchObject({ state: 'frozen', ySplit: 3 });
    // A number that begins like a formula stays a text.
    expect(set.getCell('A5').value).toBe('=1+1');
    expect(set.getRow(4).getCell(columnOf(set, 'setAt')).numFmt).toBe('yyyy-mm-dd hh:mm');

    const pours = workbook.getWorksheet('Pours')!;
    const lot = pours.getRow(4).getCell(columnOf(pours, 'lot'));
    expect(lot.dataValidation).toMatchObject({
      type: 'list',
      errorStyle: 'warning',
      formulae: ['Lists!$C$2:$C$3'],
    });
    expect(workbook.getWorksheet('Lists')!.getCell('C2').value).toBe('L-100');
    expect(set.getRow(4).getCell(columnOf(set, 'ground')).dataValidation).toMatchObject({ type: 'list' });
  });

  it('warns of what can hurt', async () => {
    const workbook = await readWorkbookBytes(await template());
    const guide =
      workbook.sheets[0]?.rows.flatMap((row) => row.cells.map((cell) => cell.raw)).join(' ') ?? '';
    for (const word of [
      'isocyanates',
      'Never close a container',
      'energised',
      'located',
      'open bore',
      'licensed engineer',
    ]) {
      expect(guide).toContain(word);
    }
  });

  it('fails when its target fails', async () => {
    const broken = new Writable({ write: (_chunk, _encoding, next) => next(new Error('gone')) });
    await expect(writeTemplate(broken, INPUT)).rejects.toThrow('gone');
  });
});

import { Writable } from 'node:stream';
import ExcelJS from 'exceljs';
import { describe, expect, it } from 'vitest';
import { readWorkbookBytes } from './read-workbook-bytes.ts';
import { ours, type Seen, theirs } from './second-opinion-for-tests.ts';
import { writeWorkbook } from './write-workbook.ts';

async function agree(bytes: Buffer): Promise<Seen> {
  const seen = ours(await readWorkbookBytes(bytes));
  expect(seen).toEqual(theirs(bytes));
  return seen;
}

describe('another reader sees the same cells', { timeout: 30_000 }, () => {
  it('in a workbook with every kind of cell', async () => {
    const workbook = new ExcelJS.Workbook();
    const sheet = workbook.addWorksheet('Set & Straighten');
    sheet.getCell('B2').value = {
      richText: [{ text: 'soil ' }, { font: { bold: true }, text: 'over rock' }],
    };
    sheet.getCell('C2').value = { formula: '1+1', result: 2 };
    sheet.getCell('D2').value = { error: '#N/A' };
    sheet.getCell('E2').value = true;
    sheet.getCell('F2').value = new Date(Date.UTC(2026, 3, 14, 10, 24));
    sheet.getCell('G2').value = '_x0041_ <&> “6½” 杭\nline';
    sheet.getCell('XFD1048576').value = -0.1;
    sheet.mergeCells('A5:B6');
    sheet.getCell('A5').value = 'merged';
    workbook.addWorksheet('Empty');
    const seen = await agree(Buffer.from(await workbook.xlsx.writeBuffer()));
    expect(seen['Set & Straighten']).toMatchObject({
      B2: 'soil over rock',
      C2: 2,
      D2: '#N/A',
      E2: true,
      XFD1048576: -0.1,
    });
  });

  it('in a workbook of the 1904 system', async () => {
    const workbook = new ExcelJS.Workbook();
    workbook.properties.date1904 = true;
    workbook.addWorksheet('Set').getCell('A1').value = new Date(Date.UTC(2026, 3, 14, 12));
    const bytes = Buffer.from(await workbook.xlsx.writeBuffer());
    const read = await readWorkbookBytes(bytes);
    // 2026-04-14 is day 44664 of the 1904 system.
    expect(read.date1904).toBe(true);
    expect(read.sheets[0]?.rows[0]?.cells[0]).toMatchObject({ number: 44_664.5, dateFormat: true });
  });

  it('in a batch of our own writing', async () => {
    const chunks: Buffer[] = [];
    const sink = new Writable({
      write: (chunk: Buffer, _, next) => {
        chunks.push(chunk);
        next();
      },
    });
    const set = Array.from({ length: 50 }, (_, index) => ({
      structureNumber: `4471/${index}`,
      boreTopIn: index % 3 === 0 ? '18 1/2' : 18 + index / 8,
      setAt: '2026-04-14T10:24',
      notes: 'wet, dug by hand',
    }));
    await writeWorkbook(sink, { workOrder: 'WO-7', contractor: 'Pike Line', foreman: 'Jo', set });
    const seen = await agree(Buffer.concat(chunks));
    expect(Object.keys(seen['Set'] ?? {}).length).toBeGreaterThan(200);
  });
});

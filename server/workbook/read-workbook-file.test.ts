import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import ExcelJS from 'exceljs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readWorkbookFile } from './read-workbook-file.ts';

let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'reader-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function save(name: string, content: Buffer | string): Promise<string> {
  const path = join(folder, name);
  await writeFile(path, content);
  return path;
}

async function smallWorkbook(): Promise<string> {
  const workbook = new ExcelJS.Workbook();
  workbook.addWorksheet('Set').addRow(['structureNumber', 6.5]);
  return save('small.xlsx', Buffer.from(await workbook.xlsx.writeBuffer()));
}

describe('reading in a process of its own', { timeout: 30_000 }, () => {
  it('hands over the cells', async () => {
    const { sheets } = await readWorkbookFile(await smallWorkbook());
    expect(sheets[0]?.rows[0]?.cells).toEqual([
      { address: 'A1', column: 1, kind: 'text', raw: 'structureNumber' },
      { address: 'B1', column: 2, kind: 'number', raw: '6.5', number: 6.5 },
    ]);
  });

  it('passes on why the file was refused', async () => {
    await expect(readWorkbookFile(await save('a.xlsx', 'hello'))).rejects.toMatchObject({
      code: 'not-a-workbook',
    });
    await expect(readWorkbookFile(await save('b.xlsx', ''))).rejects.toMatchObject({ code: 'empty-file' });
  });

  it('ends a reading that takes too long or too much memory, with a code', async () => {
    const path = await smallWorkbook();
    await expect(readWorkbookFile(path, { timeLimitMs: 1 })).rejects.toMatchObject({ code: 'reader-time' });
    await expect(readWorkbookFile(path, { memoryLimitBytes: 1 })).rejects.toMatchObject({
      code: 'reader-memory',
    });
  });

  it('says so when its heap is full, as when its memory is', async () => {
    // Too little even to start with: the process ends itself before it has read anything.
    await expect(readWorkbookFile(await smallWorkbook(), { heapLimitMb: 4 })).rejects.toMatchObject({
      code: 'reader-memory',
    });
  });

  it('calls an exit without an answer a failure', async () => {
    // A folder opens but cannot be read: the process ends with an error of its own.
    await expect(readWorkbookFile(folder)).rejects.toMatchObject({ code: 'reader-failed' });
  });

  it('reads several at once, each in its turn', async () => {
    const path = await smallWorkbook();
    const workbooks = await Promise.all([1, 2, 3].map(() => readWorkbookFile(path)));
    expect(workbooks.map((workbook) => workbook.sheets.length)).toEqual([1, 1, 1]);
  });
});

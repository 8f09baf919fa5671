import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { startCheckProcess } from '#server/modules/check/check-process.ts';
import { PictureProcess } from '#server/modules/photos/picture-process.ts';
import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import { writeWorkbook } from '#server/workbook/write-workbook.ts';
import { buildChildPrograms } from './child-programs.mjs';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));

describe('the programs of child processes, as npm start builds them', () => {
  let folder = '';
  let workbook = '';

  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'upstand-children-test-'));
    workbook = join(folder, 'one-line.xlsx');
    await writeWorkbook(workbook, {
      workOrder: 'WO-1',
      contractor: 'Crew',
      foreman: 'F',
      set: [{ structureNumber: 'K-7', embedmentFt: 6 }],
    });
    vi.stubEnv('CHILD_PROGRAMS', await buildChildPrograms(ROOT));
  });
  afterAll(async () => {
    vi.unstubAllEnvs();
    await rm(folder, { recursive: true, force: true });
  });

  it('read a workbook', async () => {
    const { sheets } = await readWorkbookFile(workbook);
    const texts = sheets.flatMap(({ rows }) => rows.flatMap(({ cells }) => cells.map(({ raw }) => raw)));
    expect(texts).toContain('K-7');
  });

  it('check one', async () => {
    const checking = startCheckProcess(workbook, new AbortController().signal);
    try {
      expect(await checking.needs()).toMatchObject({ lines: 1, structureKeys: ['K-7'] });
    } finally {
      checking.end();
    }
  });

  it('look at a picture', async () => {
    const source = join(folder, 'grey.jpg');
    await sharp({ create: { width: 640, height: 480, channels: 3, background: '#808080' } })
      .jpeg()
      .toFile(source);
    const pictures = new PictureProcess();
    try {
      const asked = { source, thumb: join(folder, 'thumb.webp'), display: join(folder, 'display.webp') };
      const answer = await pictures.decode(asked, new AbortController().signal);
      expect(answer).toMatchObject({ type: 'facts', facts: { width: 640, height: 480 } });
    } finally {
      pictures.close();
    }
  });
});

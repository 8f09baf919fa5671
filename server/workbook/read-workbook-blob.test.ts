import { describe, expect, it } from 'vitest';
import { CELL_TRAPS } from '#tests/fixtures/workbooks/cell-traps.ts';
import { CONTENT_TRAPS } from '#tests/fixtures/workbooks/content-traps.ts';
import { REFUSED_FILES } from '#tests/fixtures/workbooks/refused-files.ts';
import type { Trap } from '#tests/fixtures/workbooks/trap.ts';
import { XML_TRAPS } from '#tests/fixtures/workbooks/xml-traps.ts';
import { ZIP_TRAPS } from '#tests/fixtures/workbooks/zip-traps.ts';
import { rowsFile } from '#tests/fixtures/workbooks/trap.ts';
import { readWorkbookBlob } from '#shared/workbook/read-workbook-blob.ts';
import type { Workbook } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { readWorkbookBytes } from './read-workbook-bytes.ts';

const TRAPS: readonly Trap[] = [...CELL_TRAPS, ...CONTENT_TRAPS, ...XML_TRAPS, ...ZIP_TRAPS];
const GOOD = rowsFile('<row r="1"><c r="A1"><v>1</v></c></row>');

async function outcome(read: () => Promise<Workbook>): Promise<unknown> {
  try {
    return await read();
  } catch (error) {
    if (!(error instanceof WorkbookRefused)) throw error;
    return { code: error.code, params: error.params };
  }
}

describe('a workbook read as a browser reads it', { timeout: 60_000 }, () => {
  it.each([...TRAPS.map(({ name, bytes }) => ({ name, bytes: () => bytes() })), ...REFUSED_FILES])(
    'is what the server reads, or refused for the same reason: $name',
    async ({ bytes }) => {
      const whole = bytes(GOOD);
      const here = await outcome(() => readWorkbookBlob(new Blob([new Uint8Array(whole)])));
      expect(here).toEqual(await outcome(() => readWorkbookBytes(whole)));
    },
  );
});

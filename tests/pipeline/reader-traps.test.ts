import { describe, expect, it } from 'vitest';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';
import { ours, theirs } from '#server/workbook/second-opinion-for-tests.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { CELL_TRAPS } from '#tests/fixtures/workbooks/cell-traps.ts';
import { CONTENT_TRAPS } from '#tests/fixtures/workbooks/content-traps.ts';
import type { Trap } from '#tests/fixtures/workbooks/trap.ts';
import { XML_TRAPS } from '#tests/fixtures/workbooks/xml-traps.ts';
import { ZIP_TRAPS } from '#tests/fixtures/workbooks/zip-traps.ts';

/** What the sentence must tell: how to go on. */
const REMEDY = /\b(?:Save|Open|Upload|Choose|Remove|Hand|Unmerge)\b/u;

async function outcome(bytes: Buffer): Promise<{ gets: Trap['gets']; sentence: string; seen: unknown }> {
  try {
    const workbook = await readWorkbookBytes(bytes);
    const cells = (workbook.sheets[0]?.rows ?? []).flatMap((row) => row.cells);
    const first = workbook.sheets[0]?.name ?? '';
    return {
      gets: cells.map(({ address, kind, raw }) => [address, kind, raw] as const),
      sentence: '',
      seen: ours(workbook)[first],
    };
  } catch (error) {
    if (!(error instanceof WorkbookRefused)) throw error;
    return { gets: error.code, sentence: refusalText(error), seen: null };
  }
}

describe.each([
  ['content', CONTENT_TRAPS],
  ['zip directory', ZIP_TRAPS],
  ['XML', XML_TRAPS],
  ['cells', CELL_TRAPS],
] as const)('%s', (_, traps) => {
  it.each(traps.map((trap) => [trap.name, trap] as const))('%s', async (__, { bytes, gets, alone }) => {
    const file = bytes();
    const found = await outcome(file);
    expect(found.gets).toEqual(gets);
    if (typeof gets === 'string') expect(found.sentence).toMatch(REMEDY);
    else if (alone === undefined) expect(Object.values(theirs(file))[0]).toEqual(found.seen);
  });
});

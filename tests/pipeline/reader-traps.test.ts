import { isDeepStrictEqual } from 'node:util';
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

type Outcome = {
  readonly gets: Trap['gets'];
  /** A refusal tells how to go on. */
  readonly remedy: boolean;
  /** The other reader sees the same. */
  readonly agrees: boolean;
};

async function outcome({ bytes, alone }: Trap): Promise<Outcome> {
  const file = bytes();
  try {
    const workbook = await readWorkbookBytes(file);
    const gets = (workbook.sheets[0]?.rows ?? [])
      .flatMap((row) => row.cells)
      .map(({ address, kind, raw }) => [address, kind, raw] as const);
    const first = ours(workbook)[workbook.sheets[0]?.name ?? ''];
    const agrees = alone !== undefined || isDeepStrictEqual(Object.values(theirs(file))[0], first);
    return { gets, remedy: true, agrees };
  } catch (error) {
    if (!(error instanceof WorkbookRefused)) throw error;
    return { gets: error.code, remedy: REMEDY.test(refusalText(error)), agrees: true };
  }
}

describe.each([
  ['content', CONTENT_TRAPS],
  ['zip directory', ZIP_TRAPS],
  ['XML', XML_TRAPS],
  ['cells', CELL_TRAPS],
] as const)('%s', (_, traps) => {
  it.each(traps.map((trap) => [trap.name, trap] as const))('%s', async (__, trap) => {
    expect(await outcome(trap)).toEqual({ gets: trap.gets, remedy: true, agrees: true });
  });
});

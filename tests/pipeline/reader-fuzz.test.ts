import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readWorkbookBytes } from '#server/workbook/read-workbook-bytes.ts';
import { zipParts } from '#server/workbook/zip-for-tests.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import type { Cell, Workbook } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { cellAddress, parseAddress } from '#shared/workbook/xml/cell-address.ts';
import { HONEST_WORKBOOK, honestCells, honestFile } from '#tests/fixtures/workbooks/honest-workbook.ts';
import { OWNED_PARTS, ownersAt } from '#tests/fixtures/workbooks/owned-parts.ts';

/** Always the same files: a failure comes again. */
const SEED = 20_261_201;

/** The reading of a file, or null where it was refused with a code and a sentence; any other error goes on. */
async function reading(bytes: Buffer): Promise<Workbook | null> {
  try {
    const workbook = await readWorkbookBytes(bytes);
    expectSound(workbook);
    return workbook;
  } catch (error) {
    if (!(error instanceof WorkbookRefused)) throw error;
    const sentence = refusalText(error);
    if (!/^[A-Z“].{20,}\.$/su.test(sentence)) throw new Error(`No sentence: ${sentence}`, { cause: error });
    return null;
  }
}

const cellsOf = (workbook: Workbook): Cell[] =>
  workbook.sheets.flatMap((sheet) => sheet.rows.flatMap((row) => row.cells));

/** What is in a workbook, but for how its numbers are shown: a file may do without its styles. */
function seen(workbook: Workbook): unknown {
  const sheets = workbook.sheets.map(({ name, kind, hidden, merged, rows }) => ({
    name,
    kind,
    hidden,
    merged,
    cells: rows.flatMap((row) => row.cells.map((cell) => [cell.address, cell.kind, cell.raw, cell.formula])),
  }));
  return { date1904: workbook.date1904, sheets };
}

/** What holds for every reading, whatever the file. */
function expectSound(workbook: Workbook): void {
  for (const sheet of workbook.sheets) {
    const rows = sheet.rows.map((row) => row.row);
    expect(rows).toEqual([...new Set(rows)].toSorted((a, b) => a - b));
    for (const { row, cells } of sheet.rows) {
      const columns = cells.map((cell) => cell.column);
      expect(columns).toEqual([...new Set(columns)].toSorted((a, b) => a - b));
      for (const cell of cells) {
        expect(cell.address).toBe(cellAddress(row, cell.column));
        expect(parseAddress(cell.address)).not.toBeNull();
        expect(!/[\0\p{Surrogate}]/u.test(cell.raw)).toBe(true);
        expect(cell.number === undefined).toBe(cell.kind !== 'number');
        expect(cell.number ?? 0).toBe(Number(cell.kind === 'number' ? cell.raw : 0));
        expect(Number.isFinite(cell.number ?? 0)).toBe(true);
      }
    }
  }
  readSource(workbook);
}

describe('a workbook written in any honest way', () => {
  it('is read as what it holds', { timeout: 60_000 }, async () => {
    await fc.assert(
      fc.asyncProperty(HONEST_WORKBOOK, async (book) => {
        const workbook = await readWorkbookBytes(honestFile(book));
        expectSound(workbook);
        expect(cellsOf(workbook).map(({ address, kind, raw }) => [address, kind, raw])).toEqual(
          honestCells(book),
        );
      }),
      { seed: SEED, numRuns: 250 },
    );
  });
});

const SNIPPETS = [
  '<',
  '>',
  '"',
  "'",
  '&',
  '/',
  '=',
  ' ',
  '&amp;',
  '&lol;',
  '&#0;',
  '&#xD800;',
  '<x/>',
  '<!--',
  '-->',
  '<![CDATA[',
  ']]>',
  '<?x?>',
  '<!DOCTYPE a>',
  '_x0000_',
  '_xD800_',
  '</c>',
  '</row>',
  '<v>7</v>',
  '<f/>',
  '1e999',
  'NaN',
  '-',
  '.',
  '9'.repeat(400),
  '\0',
  '\u{1f600}',
  '\ufeff',
  ' r="A1"',
  ' t="s"',
  ' t="b"',
  '<extLst>',
];

/** A place in something, as a share of its length. */
// Without the bias of fast-check, which would damage little but the beginning.
const PLACE = fc.noBias(fc.integer({ min: 0, max: 999_999 })).map((place) => place / 1_000_000);
const at = (place: number, length: number): number => Math.floor(place * length);

const DAMAGE = fc.record({
  part: fc.constantFrom(
    ...Object.keys(OWNED_PARTS),
    'xl/worksheets/sheet1.xml',
    'xl/worksheets/sheet1.xml',
    'xl/sharedStrings.xml',
  ),
  place: PLACE,
  removed: fc.integer({ min: 0, max: 3 }),
  put: fc.oneof(fc.constantFrom(...SNIPPETS), fc.string({ unit: 'binary-ascii', maxLength: 2 })),
});

describe('damaged XML in a sound zip file', () => {
  it('is refused, or changes the very cell that was damaged and no other', { timeout: 60_000 }, async () => {
    const sound = new Map(
      cellsOf((await reading(zipParts(OWNED_PARTS)))!).map((cell) => [cell.address, cell]),
    );
    expect(sound.size).toBe(10);
    let read = 0;
    await fc.assert(
      fc.asyncProperty(DAMAGE, async ({ part, place, removed, put }) => {
        const text = String(OWNED_PARTS[part]);
        const from = at(place, text.length);
        const damaged = text.slice(0, from) + put + text.slice(from + removed);
        const workbook = await reading(zipParts({ ...OWNED_PARTS, [part]: damaged }));
        if (workbook === null) return;
        read++;
        // What is put between two cells may become part of either.
        const touched = Array.from({ length: removed + 2 }, (_, index) =>
          ownersAt(part, from - 1 + index),
        ).flat();
        const now = new Map(cellsOf(workbook).map((cell) => [cell.address, cell]));
        for (const [address, cell] of sound) {
          if (touched.includes(address)) continue;
          // A style may be damaged so that it shows no date: the number is still the number.
          const { kind, raw } = cell;
          expect(now.get(address)).toMatchObject({ kind, raw });
        }
        // A cell whose address was damaged turns up elsewhere; nothing else is new.
        expect([...now.keys()].filter((address) => !sound.has(address)).length).toBeLessThanOrEqual(
          touched.length === 0 ? 0 : 1,
        );
      }),
      { seed: SEED, numRuns: 1_000 },
    );
    // Else the damage would be such that nothing was ever read.
    expect(read).toBeGreaterThan(100);
  });
});

const BYTES = fc.array(
  fc.record({ place: PLACE, removed: fc.integer({ min: 0, max: 4 }), put: fc.uint8Array({ maxLength: 4 }) }),
  {
    minLength: 1,
    maxLength: 3,
  },
);

describe('damaged bytes of a zip file', () => {
  it('are refused, or matter nothing', { timeout: 60_000 }, async () => {
    const file = zipParts(OWNED_PARTS);
    const sound = seen((await reading(file))!);
    let read = 0;
    await fc.assert(
      fc.asyncProperty(BYTES, async (damages) => {
        let bytes = file;
        for (const { place, removed, put } of damages) {
          const from = at(place, bytes.length);
          bytes = Buffer.concat([bytes.subarray(0, from), put, bytes.subarray(from + removed)]);
        }
        const workbook = await reading(bytes);
        if (workbook === null) return;
        read++;
        expect(seen(workbook)).toEqual(sound);
      }),
      { seed: SEED, numRuns: 1_000 },
    );
    expect(read).toBeGreaterThan(5);
  });

  it('of one bit anywhere are refused, or matter nothing', { timeout: 60_000 }, async () => {
    const file = zipParts(OWNED_PARTS);
    const sound = seen((await reading(file))!);
    await fc.assert(
      fc.asyncProperty(PLACE, fc.nat(7), async (place, bit) => {
        const bytes = Buffer.from(file);
        const where = at(place, bytes.length);
        bytes[where] = bytes[where]! ^ (1 << bit);
        const workbook = await reading(bytes);
        expect(workbook === null ? sound : seen(workbook)).toEqual(sound);
      }),
      { seed: SEED, numRuns: 1_000 },
    );
  });
});

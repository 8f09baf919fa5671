import { describe, expect, it } from 'vitest';
import { drawSheet } from './draw-sheet.ts';
import { relevelGrid, setGrid, straightenGrid } from './structures-for-tests.ts';
import { crossedDimensions, outside, overlaps, someFindings, TITLE, type GridRecord } from './testing.ts';

const LIMITS = {
  annulusLeastIn: 2,
  waterMostIn: 2,
  fillLeast: 1,
  leanMostInPer10Ft: 1,
  slopeMostInPerFt: 0.25,
};
const STAMP = { word: 'Approved', tone: 'conform', detail: 'R. Osei, 15 Apr 2026' } as const;
const DECIDED = { ...TITLE, decided: 'approved by R. Osei, 15 Apr 2026' };

const GRIDS: readonly [string, readonly GridRecord[]][] = [
  ['set', setGrid()],
  ['straighten', straightenGrid()],
  ['relevel', relevelGrid()],
];

/** A sheet whose words lie over each other or leave it, or whose dimensions run into one another. */
function faults(record: GridRecord, index: number, narrow: boolean): string[] {
  const sheet = drawSheet({
    record: { ...record, structureNumber: '17-0417' },
    findings: someFindings(record.kind, [0, 3, 8][index % 3] ?? 0),
    limits: LIMITS,
    titleBlock: index % 2 === 0 ? TITLE : DECIDED,
    stamp: index % 2 === 0 ? null : STAMP,
    narrow,
    metric: index % 10 === 9,
  });
  return [
    ...overlaps(sheet.marks),
    ...outside(sheet.marks, sheet).map((id) => `${id} outside`),
    ...crossedDimensions(sheet.marks),
    ...sheet.leftOut.map((finding) => `finding ${finding.number} left out`),
  ];
}

describe.each(GRIDS)('two hundred structures: %s', (_, grid) => {
  it.each([
    ['wide', false],
    ['narrow', true],
  ])(
    'nothing overlaps or leaves the sheet: %s',
    (__, narrow) => {
      expect(grid).toHaveLength(200);
      const found = grid.flatMap((record, index) =>
        faults(record, index, narrow).map((fault) => `${index}: ${fault}`),
      );
      expect(found).toEqual([]);
      // Two hundred drawings on a busy machine.
    },
    60_000,
  );
});

it('holds for a plan without a title block and without anything', () => {
  for (const { kind } of [{ kind: 'set' }, { kind: 'straighten' }, { kind: 'relevel' }] as const) {
    const sheet = drawSheet({
      record: {
        kind,
        structureNumber: 'P-1',
        values: {},
        derived: { ...setGrid()[0]!.derived, dueFt: null },
      },
      findings: [],
      purpose: 'plan',
    });
    expect([...overlaps(sheet.marks), ...outside(sheet.marks, sheet)]).toEqual([]);
    expect(sheet.marks.every((mark) => mark.is !== 'path' || !/NaN|Infinity/.test(mark.d))).toBe(true);
  }
});

import { describe, expect, it } from 'vitest';
import type { SourceBatch, SourceLine } from '#shared/records/types.ts';
import { nameOtherOrder } from '#shared/check/name-other-order.ts';
import { scopeToReturned } from './scope-to-returned.ts';

const line = (structureNumber: string): SourceLine => ({
  kind: 'set',
  structureNumber,
  sheet: 'Set',
  row: 4,
  values: { structureNumber },
  cells: {},
  problems: [],
});
const source = (numbers: string[], workOrder: string | null = 'WO-1'): SourceBatch => ({
  batch: {
    sheet: 'Batch',
    row: 1,
    values: workOrder === null ? {} : { workOrder },
    cells: { workOrder: { address: 'C1', raw: workOrder ?? '' } },
    problems: [],
  },
  lines: numbers.map(line),
  pours: [],
  events: [],
  photos: [],
  notices: [],
  templateVersion: null,
});

describe('scopeToReturned', () => {
  it('takes returned lines only and names the others in a note', () => {
    const scoped = scopeToReturned(source(['L-1', ' l-2 ', 'L-3']), new Set(['set|L-2']));
    expect(scoped.lines.map((one) => one.structureNumber)).toEqual([' l-2 ']);
    expect(scoped.notices).toEqual([
      {
        code: 'workbook-not-returned',
        severity: 'note',
        sheet: 'Set',
        address: null,
        params: { structures: 'L-1, L-3', more: 0 },
      },
    ]);
  });
  it('says nothing when all are returned', () => {
    const all = source(['L-1']);
    expect(scopeToReturned(all, new Set(['set|L-1']))).toBe(all);
  });
});

describe('nameOtherOrder', () => {
  it('says which order the workbook is for', () => {
    expect(nameOtherOrder(source([], 'WO-2'), 'WO-1').notices).toMatchObject([
      {
        code: 'workbook-other-order',
        severity: 'nonconformity',
        address: 'C1',
        params: { written: 'WO-2', order: 'WO-1' },
      },
    ]);
  });
  it.each(['WO-1', ' wo-1', null])('says nothing of %j', (written) => {
    expect(nameOtherOrder(source([], written), 'WO-1').notices).toEqual([]);
  });
});

import { describe, expect, it } from 'vitest';
import { readRecordNumbers, scopeText } from './scope-text.ts';

const KNOWN = {
  workOrders: [{ value: 'w1', label: '17 Fallow Road' }],
  filters: [
    { name: 'lot', label: 'Lot' },
    { name: 'kind', label: 'Kind', options: [{ value: 'relevel', label: 're-level' }] },
  ],
};

describe('scopeText', () => {
  it.each([
    [{ workOrder: 'w1' }, 'work order 17 Fallow Road'],
    [{ workOrder: 'gone' }, 'one work order'],
    [{ recordNumbers: ['R-000001'] }, 'records R-000001'],
    [{ recordNumbers: ['a', 'b', 'c', 'd', 'e', 'f', 'g'] }, 'records a, b, c, d, e and 2 more'],
    [{ filter: { lot: 'LK-2204', kind: 'relevel' } }, 'the register: lot LK-2204, kind re-level'],
    [{ filter: {} }, 'the whole register'],
    [{}, 'a scope this page does not know'],
  ])('%j', (scope, text) => expect(scopeText(scope, KNOWN)).toBe(text));
});

it('record numbers are read however they are parted', () => {
  expect(readRecordNumbers(' R-000001, R-000002;\nR-000001\tR-000003 ')).toEqual([
    'R-000001',
    'R-000002',
    'R-000003',
  ]);
});

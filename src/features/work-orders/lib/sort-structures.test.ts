import { expect, it } from 'vitest';
import { arrange, occurring } from './sort-structures.ts';
import type { DesignRow } from './with-due.ts';

const row = (structureNumber: string, poleLengthFt: number | null, state: DesignRow['state'] = 'planned') =>
  ({
    structureNumber,
    kind: 'set',
    state,
    design: { poleLengthFt, poleClass: poleLengthFt === null ? null : 'H1', ground: 'soil' },
  }) as DesignRow;
const ROWS = [row('17-10', 40), row('17-9', null, 'on-record'), row('17-2', 45, 'in-batch')];
const numbers = (key: string, descending: boolean) =>
  arrange(ROWS, { values: {}, sort: { key, descending } }).map((one) => one.structureNumber);

it('sorts numbers within names as numbers', () => {
  expect(numbers('structure', false)).toEqual(['17-2', '17-9', '17-10']);
});

it('puts what is not known last, both ways', () => {
  expect(numbers('length', false)).toEqual(['17-10', '17-2', '17-9']);
  expect(numbers('length', true)).toEqual(['17-2', '17-10', '17-9']);
});

it('sorts states in the order of a life', () => {
  expect(numbers('state', false)).toEqual(['17-10', '17-2', '17-9']);
});

it('filters, and leaves the order alone when no sort is chosen', () => {
  const found = arrange(ROWS, { values: { state: 'in-batch' }, sort: null });
  expect(found.map((one) => one.structureNumber)).toEqual(['17-2']);
  expect(arrange(ROWS, { values: { structure: '17-' }, sort: null })).toEqual(ROWS);
});

it('offers only values that occur', () => {
  expect(occurring(ROWS, (one) => one.design.poleClass)).toEqual([{ value: 'H1', label: 'H1' }]);
});

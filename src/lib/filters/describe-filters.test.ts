import { expect, it } from 'vitest';
import { describeFilters } from '#src/lib/filters/describe-filters.ts';

it('filters in words, in the order of the bar', () => {
  const define = [
    { name: 'contractor', label: 'Contractor', options: [{ value: 'o1', label: 'Brindle' }] },
    { name: 'lot', label: 'Lot' },
  ];
  expect(describeFilters(define, { lot: 'LK-2291', contractor: 'o1', other: 'x' })).toBe(
    'contractor Brindle, lot LK-2291',
  );
  expect(describeFilters(define, {})).toBe('');
});

import { describe, expect, it } from 'vitest';
import { nextSort, parseSort, readFilters, sortText, writeFilters } from '#src/lib/filters/filter-params.ts';

describe('filters in the address', () => {
  it('reads only its own names and no blanks', () => {
    const search = new URLSearchParams('severity=nonconformity&rule=&other=1&lot=%20LK-2291%20');
    expect(readFilters(search, ['severity', 'rule', 'lot'])).toEqual({
      severity: 'nonconformity',
      lot: 'LK-2291',
    });
  });

  it('writes so that the same filters give the same address', () => {
    const one = writeFilters(writeFilters(new URLSearchParams(), { rule: 'fill-short' }), { lot: 'LK-2291' });
    const other = writeFilters(writeFilters(new URLSearchParams(), { lot: 'LK-2291' }), {
      rule: 'fill-short',
    });
    expect(one.toString()).toBe('lot=LK-2291&rule=fill-short');
    expect(other.toString()).toBe(one.toString());
  });

  it('drops the place in the old list and what was cleared, keeps the rest', () => {
    const search = new URLSearchParams('cursor=abc&rule=fill-short&sort=-margin');
    expect(writeFilters(search, { rule: null }).toString()).toBe('sort=-margin');
  });

  it('sorts up, down, and not at all', () => {
    const up = nextSort(null, 'margin');
    const down = nextSort(up, 'margin');
    expect([sortText(up), sortText(down), sortText(nextSort(down, 'margin'))]).toEqual([
      'margin',
      '-margin',
      null,
    ]);
    expect(parseSort('-margin', ['margin'])).toEqual({ key: 'margin', descending: true });
    expect(parseSort('drop table', ['margin'])).toBeNull();
  });
});

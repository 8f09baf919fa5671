import { describe, expect, it } from 'vitest';
import { toggled, toggledThrough } from './selection.ts';

const ORDER = ['a', 'b', 'c', 'd'];

describe('selection', () => {
  it('toggles one', () => {
    expect([...toggled(new Set(['a']), 'b')]).toEqual(['a', 'b']);
    expect([...toggled(new Set(['a', 'b']), 'a')]).toEqual(['b']);
  });

  it('takes every row from the one before, either way', () => {
    expect([...toggledThrough(new Set(['a']), { order: ORDER, anchor: 'a', id: 'c' })]).toEqual([
      'a',
      'b',
      'c',
    ]);
    expect([...toggledThrough(new Set(['d']), { order: ORDER, anchor: 'd', id: 'b' })].toSorted()).toEqual([
      'b',
      'c',
      'd',
    ]);
    expect([...toggledThrough(new Set(ORDER), { order: ORDER, anchor: 'a', id: 'b' })]).toEqual(['c', 'd']);
  });

  it('toggles one where the row before is gone', () => {
    expect([...toggledThrough(new Set(), { order: ORDER, anchor: 'x', id: 'b' })]).toEqual(['b']);
  });
});

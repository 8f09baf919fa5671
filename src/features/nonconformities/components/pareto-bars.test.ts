import { describe, expect, it } from 'vitest';
import { paretoBars, wrapTitle } from './pareto-bars.ts';

const rule = (code: string, count: number, running: number) => ({
  code,
  title: code,
  count,
  share: count / 20,
  running,
});

describe('paretoBars', () => {
  const rules = [
    rule('a', 8, 0.4),
    rule('b', 6, 0.7),
    rule('c', 3, 0.85),
    rule('d', 2, 0.95),
    rule('e', 1, 1),
  ];

  it('puts the rest into one bar and marks the few that make up the first half', () => {
    expect(paretoBars(rules, 4)).toEqual([
      { code: 'a', title: 'a', count: 8, running: 0.4, few: true },
      { code: 'b', title: 'b', count: 6, running: 0.7, few: true },
      { code: 'c', title: 'c', count: 3, running: 0.85, few: false },
      { code: null, title: '2 other rules', count: 3, running: 1, few: false },
    ]);
  });

  it('needs no rest where all fit', () => {
    expect(paretoBars(rules, 5).map((bar) => bar.code)).toEqual(['a', 'b', 'c', 'd', 'e']);
    expect(paretoBars([], 5)).toEqual([]);
  });
});

describe('wrapTitle', () => {
  it.each([
    ['Embedment short', 10, ['Embedment', 'short']],
    ['Hardware too early', 10, ['Hardware', 'too early']],
    ['Fill short', 12, ['Fill short']],
    ['Photograph of another place', 10, ['Photograph', 'of anothe…']],
    ['Straightening', 6, ['Strai…']],
  ])('%s', (title, width, lines) => expect(wrapTitle(title, { width, lines: 2 })).toEqual(lines));
});

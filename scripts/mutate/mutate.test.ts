import { runInThisContext } from 'node:vm';
import { transformSync } from 'esbuild';
import { describe, expect, it } from 'vitest';
import { testCollector } from './collect-tests.ts';
import { findComparisons } from './find-comparisons.ts';
import { instrument } from './instrument.ts';
import { matchEquivalents } from './match-equivalents.ts';
import { Runaway, switchCalls, type MutantSwitch } from './mutant-switch.ts';

const flips = (source: string) =>
  findComparisons('a.ts', source).map(({ code, from, to }) => [code, from, to]);

/** Runs `source`, an expression, with the mutant of that number on; -1 for none. */
function valueOf(source: string, active: number, budget = 100): unknown {
  const found = findComparisons('a.ts', source);
  const state: MutantSwitch = { active, hits: new Map(), budget };
  const { __compare, __named } = switchCalls(state, found);
  const { code } = transformSync(instrument(source, found, 0), { loader: 'ts' });
  const run = runInThisContext(`(function (__compare, __named) { return ${code} })`) as (
    ...calls: unknown[]
  ) => unknown;
  return run(__compare, __named);
}

describe('comparisons', () => {
  it('are found each one, nested, in comments’ company and by name', () => {
    expect(flips('(a as number) /* < */ < b !== c > d')).toEqual([
      ['(a as number) /* < */ < b !== c > d', '!==', '==='],
      ['(a as number) /* < */ < b', '<', '<='],
      ['c > d', '>', '>='],
    ]);
    expect(flips('atLeast(a, b) || other(a)')).toEqual([['atLeast(a, b)', 'atLeast', 'strict atLeast']]);
    expect(flips('a + b == c ? a : `<`')).toEqual([]);
  });

  it.each([
    ['2 < 2', false, true],
    ['2 <= 2', true, false],
    ['2 > 2', false, true],
    ['2 >= 2', true, false],
    ['2 === 2', true, false],
    ['2 !== 2', false, true],
    ['2 /* > */ < (2 as number)', false, true],
  ])('%s is turned by its switch alone', (source, written, flipped) => {
    expect([valueOf(source, -1), valueOf(source, 0)]).toEqual([written, flipped]);
  });

  it('inside one another are turned one at a time', () => {
    // 3 < 3 is false, 4 > 4 is false; false !== false is false.
    expect([-1, 0, 1, 2].map((active) => valueOf('3 < 3 !== 4 > 4', active))).toEqual([
      false,
      true,
      true,
      true,
    ]);
  });

  it('that make a loop without end are stopped', () => {
    const loop = '(() => { let n = 0; while (n < 3) n = Math.min(3, n + 1); return n; })()';
    expect(valueOf(loop, -1)).toBe(3);
    expect(() => valueOf(loop, 0)).toThrow(Runaway);
  });
});

describe('the list of equivalents', () => {
  const mutant = { ...findComparisons('f.ts', 'a < b')[0]!, file: 'f.ts' };
  const entry = { file: 'f.ts', code: 'a < b', to: '<=', why: 'told' };
  const match = (survivors: number[], listed = [entry]) =>
    matchEquivalents({ mutants: [mutant], survivors, files: ['f.ts'], listed });

  it('lets a survivor pass, and complains of what is gone or noticed by now', () => {
    expect(match([0])).toEqual({ equivalent: new Set([0]), faults: [] });
    expect(match([]).faults).toEqual([expect.stringContaining('is noticed by a test')]);
    expect(match([0], [{ ...entry, code: 'a < c' }]).faults).toEqual([
      expect.stringContaining('matches no comparison'),
    ]);
  });
});

it('tests are collected with their rows', async () => {
  const { tests, api } = testCollector();
  const seen: unknown[] = [];
  api.describe('a', () => {
    api.it.each([[1, 2], 3])('b', (...row: readonly unknown[]) => seen.push(row));
    api.test('c', { timeout: 1 }, () => seen.push('c'));
  });
  for (const test of tests) await test.run();
  expect(tests.map(({ name }) => name)).toEqual(['a > b [0]', 'a > b [1]', 'a > c']);
  expect(seen).toEqual([[1, 2], [3], 'c']);
});

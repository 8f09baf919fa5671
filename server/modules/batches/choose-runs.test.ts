import { expect, it } from 'vitest';
import { chooseRuns, type FinishedRun } from './choose-runs.ts';

const run = (n: number, input: number, workbook: string | null): FinishedRun => ({
  id: `${n}.${input}`,
  input,
  n,
  workbook,
});
const from = (runs: readonly FinishedRun[], decides = false) =>
  chooseRuns(runs, { decides }).from?.id ?? null;

it('photographs after a changed workbook do not hide what it changed', () => {
  expect(from([run(0, 9, 'b'), run(0, 8, 'b'), run(0, 3, 'b'), run(0, 2, 'a'), run(0, 1, 'a')])).toBe('0.2');
});

it('one workbook: against its first check', () => {
  expect(from([run(0, 9, 'a'), run(0, 5, 'a'), run(0, 1, 'a')])).toBe('0.1');
  expect(from([run(0, 1, 'a')])).toBeNull();
  expect(chooseRuns([], { decides: false })).toEqual({ from: null, to: null });
});

it('the first check of a later revision: against the last of the one before', () => {
  expect(from([run(1, 1, 'b'), run(0, 4, 'a')])).toBe('0.4');
  expect(from([run(1, 1, null), run(0, 4, 'a')])).toBe('0.4');
});

it('who decides sees a later revision against what was decided, however often its workbook was replaced', () => {
  const runs = [run(1, 5, 'd'), run(1, 2, 'c'), run(0, 4, 'b'), run(0, 1, 'a')];
  expect(from(runs, true)).toBe('0.4');
  expect(from(runs)).toBe('1.2');
});

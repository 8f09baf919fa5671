import { describe, expect, it } from 'vitest';
import { findingInHand, stepTo, stepToFinding } from '#src/features/review/desk/steps.ts';
import { sampleFinding, sampleLine } from '#src/features/review/desk/samples.test-data.ts';

describe('going from line to line', () => {
  it('stays at both ends and begins with the first', () => {
    expect(stepTo(['a', 'b', 'c'], 'b', 1)).toBe('c');
    expect(stepTo(['a', 'b', 'c'], 'c', 1)).toBe('c');
    expect(stepTo(['a', 'b', 'c'], 'a', -1)).toBe('a');
    expect(stepTo(['a', 'b'], 'gone', 1)).toBe('a');
    expect(stepTo([], null, 1)).toBeNull();
  });
});

describe('going from finding to finding', () => {
  const findings = [
    sampleFinding({ id: 'f1', state: 'approved' }),
    sampleFinding({ id: 'f2' }),
    sampleFinding({ id: 'f3' }),
  ];
  const lines = [
    sampleLine({ id: 'l1', undecided: 1 }),
    sampleLine({ id: 'l2', undecided: 2 }),
    sampleLine({ id: 'l3', undecided: 0 }),
    sampleLine({ id: 'l4', undecided: 1 }),
  ];
  const from = (active: string | null, step: 1 | -1) =>
    stepToFinding({ lines, line: 'l2', findings, active, step });

  it('passes what is decided, on the line first', () => {
    expect(from('f1', 1)).toEqual({ line: 'l2', finding: 'f2' });
    expect(from('f2', 1)).toEqual({ line: 'l2', finding: 'f3' });
    expect(from('f3', -1)).toEqual({ line: 'l2', finding: 'f2' });
  });

  it('goes on to the next line that has an open one, and round to the beginning', () => {
    expect(from('f3', 1)).toEqual({ line: 'l4', end: 'first' });
    expect(from('f2', -1)).toEqual({ line: 'l1', end: 'last' });
    expect(stepToFinding({ lines, line: 'l4', findings: [], active: null, step: 1 })).toEqual({
      line: 'l1',
      end: 'first',
    });
  });

  it('has nowhere to go when nothing is open', () => {
    const done = [sampleLine({ id: 'l1', undecided: 0 })];
    expect(stepToFinding({ lines: done, line: 'l1', findings: [], active: null, step: 1 })).toBeNull();
  });

  it('takes the first open one in hand, or the last when one came from behind', () => {
    expect(findingInHand(findings, null, 'first')?.id).toBe('f2');
    expect(findingInHand(findings, null, 'last')?.id).toBe('f3');
    expect(findingInHand(findings, 'f1', 'first')?.id).toBe('f1');
    expect(findingInHand([], null, 'first')).toBeNull();
  });
});

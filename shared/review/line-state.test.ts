import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { closeReview } from './close-review.ts';
import type { FindingState } from './finding-decision.ts';
import { lineState } from './line-state.ts';
import { isRefusal } from './outcome.ts';

const n = (state: FindingState) => ({ severity: 'nonconformity' as const, state });
const note = { severity: 'note' as const, state: 'undecided' as const };

describe('state of a line', () => {
  it('follows its findings', () => {
    expect(lineState({ findings: [n('approved'), note], decision: null })).toBe('approved');
    expect(lineState({ findings: [n('approved'), n('undecided')], decision: null })).toBe('undecided');
    expect(lineState({ findings: [n('rejected'), n('undecided')], decision: null })).toBe('returned');
    expect(lineState({ findings: [n('concession-asked'), n('approved')], decision: null })).toBe('held');
    expect(lineState({ findings: [n('concession-asked'), n('undecided')], decision: null })).toBe(
      'undecided',
    );
  });

  it('waits for the inspector where nothing has to be decided', () => {
    expect(lineState({ findings: [note], decision: null })).toBe('undecided');
    expect(lineState({ findings: [], decision: 'approve' })).toBe('approved');
    expect(lineState({ findings: [n('approved')], decision: 'return' })).toBe('returned');
  });

  it('is approved only when no finding stands undecided, rejected or asked', () => {
    const finding = fc.record({
      severity: fc.constantFrom('nonconformity' as const, 'query' as const, 'note' as const),
      state: fc.constantFrom<FindingState>('undecided', 'approved', 'rejected', 'concession-asked'),
    });
    fc.assert(
      fc.property(
        fc.array(finding, { maxLength: 6 }),
        fc.constantFrom('approve' as const, 'return' as const, null),
        (findings, decision) => {
          const approved = lineState({ findings, decision }) === 'approved';
          const clear = findings.every((item) => item.severity === 'note' || item.state === 'approved');
          return !approved || (clear && decision !== 'return');
        },
      ),
    );
  });
});

describe('closing a review', () => {
  const line = (recordId: string, state: 'approved' | 'returned' | 'held' | 'undecided') => ({
    recordId,
    structureNumber: `17-${recordId}`,
    state,
  });

  it('sorts the lines and opens the next revision for what came back', () => {
    expect(closeReview([line('1', 'approved'), line('2', 'returned'), line('3', 'held')], 0)).toEqual({
      accepted: { approved: ['1'], returned: ['2'], held: ['3'], nextRevision: true },
    });
    expect(closeReview([line('1', 'approved')], 0)).toMatchObject({ accepted: { nextRevision: false } });
  });

  it('names what is not decided', () => {
    const outcome = closeReview([line('1', 'undecided'), line('2', 'approved')], 0);
    expect(isRefusal(outcome) && outcome.detail).toBe('One line is not decided: 17-1.');
    expect(isRefusal(closeReview([line('2', 'approved')], 1))).toBe(true);
  });
});

import { describe, expect, it } from 'vitest';
import { askConcession, decideFinding, type DecisionRequest, type FindingFacts } from './finding-decision.ts';
import { isRefusal } from './outcome.ts';

const TODAY = '2026-05-04';
const facts = (patch: Partial<FindingFacts> = {}): FindingFacts => ({
  severity: 'nonconformity',
  state: 'undecided',
  answered: false,
  ...patch,
});
const code = (finding: FindingFacts, request: DecisionRequest) => {
  const outcome = decideFinding(finding, request, TODAY);
  return isRefusal(outcome) ? outcome.refused : outcome.accepted;
};

describe('deciding a finding', () => {
  it('approves on evidence with a reason', () => {
    expect(
      code(facts(), { decision: 'approve', grounds: 'evidence', reason: ' The tape reads 6 ft. ' }),
    ).toEqual({
      decision: 'approve',
      grounds: 'evidence',
      action: null,
      dueOn: null,
      reason: 'The tape reads 6 ft.',
    });
    expect(code(facts(), { decision: 'approve', grounds: 'evidence', reason: '  ' })).toBe(
      'decision.reason-required',
    );
    expect(code(facts(), { decision: 'approve' })).toBe('decision.grounds-required');
  });

  it('lets an answer settle a query only, and only once there is one', () => {
    expect(code(facts({ answered: true }), { decision: 'approve', grounds: 'answer' })).toBe(
      'decision.answer-settles-queries-only',
    );
    expect(code(facts({ severity: 'query' }), { decision: 'approve', grounds: 'answer' })).toBe(
      'decision.not-answered',
    );
    expect(
      code(facts({ severity: 'query', answered: true }), { decision: 'approve', grounds: 'answer' }),
    ).toMatchObject({ grounds: 'answer' });
  });

  it('rejects only with an action, a due day and a reason', () => {
    const full: DecisionRequest = {
      decision: 'reject',
      action: 'rework',
      dueOn: '2026-05-11',
      reason: 'Top up the foam.',
    };
    expect(code(facts(), full)).toMatchObject({ decision: 'reject', action: 'rework', dueOn: '2026-05-11' });
    expect(code(facts(), { ...full, action: null })).toBe('decision.action-required');
    expect(code(facts(), { ...full, dueOn: null })).toBe('decision.due-required');
    expect(code(facts(), { ...full, dueOn: '2026-05-03' })).toBe('decision.due-past');
    expect(code(facts(), { ...full, reason: '' })).toBe('decision.reason-required');
  });

  it('leaves notes and asked concessions alone', () => {
    expect(code(facts({ severity: 'note' }), { decision: 'approve', grounds: 'evidence', reason: 'x' })).toBe(
      'decision.note',
    );
    expect(
      code(facts({ state: 'concession-asked' }), { decision: 'approve', grounds: 'evidence', reason: 'x' }),
    ).toBe('decision.concession-asked');
    expect(isRefusal(askConcession(facts({ state: 'concession-asked' }), 'again'))).toBe(true);
    expect(isRefusal(askConcession(facts(), ' '))).toBe(true);
    expect(askConcession(facts(), 'Rock at 5.6 ft.')).toEqual({ accepted: { reason: 'Rock at 5.6 ft.' } });
  });
});

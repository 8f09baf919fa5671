import { describe, expect, it } from 'vitest';
import {
  expectedFinding,
  expectedRecord,
  followFindings,
  withFinding,
} from '#src/features/review/desk/local-decision.ts';
import { sampleFinding, sampleLine } from '#src/features/review/desk/samples.test-data.ts';

const author = { name: 'R. Osei', at: '2026-05-04T10:00:00.000Z' };

describe('a decision shown before the server has answered', () => {
  it('stands with its author', () => {
    const finding = sampleFinding();
    const request = { decision: 'approve', grounds: 'evidence', reason: 'The tape reads 6 ft.' } as const;
    expect(expectedFinding({ type: 'finding', finding, request }, author)).toMatchObject({
      state: 'approved',
      decision: { grounds: 'evidence', reason: 'The tape reads 6 ft.', by: 'R. Osei', action: null },
      version: 0,
    });
    expect(expectedFinding({ type: 'concession', finding, reason: 'Rock.' }, author)?.state).toBe(
      'concession-asked',
    );
    const rejected = sampleFinding({ state: 'rejected' });
    expect(expectedFinding({ type: 'undo-finding', finding: rejected }, author)?.state).toBe('undecided');
  });

  it('takes the line along by its findings', () => {
    const record = sampleLine({ undecided: 2 });
    const one = sampleFinding({ id: 'f1', state: 'approved' });
    const two = sampleFinding({ id: 'f2' });
    expect(followFindings(record, [one, two])).toMatchObject({
      state: 'undecided',
      counts: { undecided: 1 },
    });
    expect(withFinding({ record, findings: [one, two] }, { ...two, state: 'rejected' }).record.state).toBe(
      'returned',
    );
    expect(
      withFinding({ record, findings: [one, two] }, { ...two, state: 'concession-asked' }).record.state,
    ).toBe('held');
    expect(withFinding({ record, findings: [one, two] }, { ...two, state: 'approved' }).record.state).toBe(
      'approved',
    );
  });

  it('approves and returns a line by its own word, and takes it back', () => {
    const record = sampleLine();
    const approve = { type: 'line', record, request: { decision: 'approve' } } as const;
    expect(expectedRecord(approve, { findings: [], author })?.state).toBe('approved');
    const back = { type: 'line', record, request: { decision: 'return', reason: 'Wrong pole.' } } as const;
    expect(expectedRecord(back, { findings: [], author })).toMatchObject({
      state: 'returned',
      decision: { reason: 'Wrong pole.', by: 'R. Osei' },
    });
    expect(expectedRecord({ type: 'undo-line', record }, { findings: [], author })?.state).toBe('undecided');
  });

  it('leaves alone what is on record', () => {
    const record = sampleLine({ state: 'on-record' });
    expect(followFindings(record, [sampleFinding()]).state).toBe('on-record');
  });
});

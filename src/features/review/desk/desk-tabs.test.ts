import { describe, expect, it } from 'vitest';
import { changedKeys, deskCounts, isClean, isUnder } from '#src/features/review/desk/desk-tabs.ts';
import { ageWords } from '#src/features/review/desk/age-words.ts';
import { dayFrom } from '#src/features/review/desk/day-from.ts';
import { sampleLine } from '#src/features/review/desk/samples.test-data.ts';

describe('lines under the tabs', () => {
  const change = {
    structureNumber: '17-0417',
    kind: 'set' as const,
    field: 'embedmentFt',
    title: 'Embedment',
  };
  const changed = changedKeys({
    from: 1,
    to: 2,
    items: [{ ...change, before: 5.8, after: 6.1, unit: 'ft', cell: 'Set!H9' }],
    added: [],
    removed: [],
    findings: { gone: [], new: [] },
  });

  it('knows which changed by kind and structure', () => {
    expect(isUnder('changed', sampleLine(), changed)).toBe(true);
    expect(isUnder('changed', sampleLine({ kind: 'straighten' }), changed)).toBe(false);
  });

  it('calls a line clean only while it is undecided and has nothing to decide', () => {
    expect(isClean(sampleLine())).toBe(true);
    expect(isClean(sampleLine({ undecided: 1 }))).toBe(false);
    expect(isClean(sampleLine({ state: 'approved' }))).toBe(false);
  });

  it('counts a review', () => {
    const states = ['approved', 'on-record', 'returned', 'held', 'undecided'] as const;
    expect(deskCounts(states.map((state) => sampleLine({ state })))).toEqual({
      lines: 5,
      approved: 2,
      returned: 1,
      held: 1,
      undecided: 1,
      clean: 1,
    });
  });
});

describe('time on the desk', () => {
  it('says how long a batch has waited', () => {
    const now = new Date('2026-05-04T12:00:00Z');
    expect(ageWords('2026-05-04T11:30:00Z', now)).toBe('under an hour');
    expect(ageWords('2026-05-04T07:00:00Z', now)).toBe('5 hours');
    expect(ageWords('2026-05-01T12:00:00Z', now)).toBe('3 days');
  });

  it('offers a due day over the end of a month', () => {
    expect(dayFrom(new Date(2026, 4, 20), 14)).toBe('2026-06-03');
  });
});

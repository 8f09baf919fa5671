import { describe, expect, it } from 'vitest';
import { countFindings } from './count-findings.ts';
import { expectation } from './expectation.ts';
import { fingerprint } from './fingerprint.ts';
import { say } from './say.ts';
import { severityOrder, worstSeverity } from './severity-order.ts';

describe('severity', () => {
  it('orders the gravest first', () => {
    expect((['note', 'nonconformity', 'query'] as const).toSorted(severityOrder)).toEqual([
      'nonconformity',
      'query',
      'note',
    ]);
  });

  it('names the worst, or none', () => {
    expect(worstSeverity([{ severity: 'note' }, { severity: 'query' }])).toBe('query');
    expect(worstSeverity([])).toBeNull();
  });

  it('counts', () => {
    expect(countFindings([{ severity: 'note' }, { severity: 'query' }, { severity: 'note' }])).toEqual({
      nonconformity: 0,
      query: 1,
      note: 2,
    });
  });
});

describe('fingerprint', () => {
  it('keeps parts apart whatever they hold', () => {
    expect(fingerprint(['a|b', 'c'])).not.toBe(fingerprint(['a', 'b|c']));
    expect(fingerprint(['a', null, 1])).toBe('a|-|1');
  });

  it('stays short, and tells long identities apart', () => {
    const long = 'x'.repeat(5000);
    expect(fingerprint([long, 'a']).length).toBeLessThanOrEqual(200);
    expect(fingerprint([long, 'a'])).not.toBe(fingerprint([long, 'b']));
  });

  it('holds nothing that a database refuses', () => {
    expect(fingerprint(['a\u0000b\uD800'])).toBe('a\uFFFDb\uFFFD');
  });
});

describe('say', () => {
  it.each([
    [5.5, 'ft', '5.5 ft'],
    [0.9226, 'ratio', '0.92'],
    [-2, 'in', '\u22122 in'],
    [7, null, '7'],
    ['2026-04-14T10:24', 'clock', '2026-04-14 10:24'],
    ['L-100', null, 'L-100'],
    [null, 'ft', '–'],
    [undefined, null, '–'],
    [['a', 2], null, 'a, 2'],
    ['x'.repeat(100), null, `${'x'.repeat(80)}…`],
  ])('%s %s', (value, unit, text) => {
    expect(say(value, unit)).toBe(text);
  });
});

describe('expectation', () => {
  it('joins reading, bounds and words', () => {
    expect(
      expectation({ read: 'length-in', minimum: 0, maximum: 480, unit: 'in', words: ['not-measured'] }),
    ).toBe('a length in inches, as 18, 18.5 or 18 1/2, from 0 in to 480 in, or "not measured"');
    expect(expectation({ allowed: ['soil', 'rock'], read: 'code' })).toBe('one of: soil, rock');
    expect(expectation({})).toBe('');
  });
});

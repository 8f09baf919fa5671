import { describe, expect, it } from 'vitest';
import { csvCell, csvLine } from './csv.ts';

describe('exported cells', () => {
  // The seven leading characters of the public guidance on CSV injection (OWASP, current text, read).
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\n=1'])(
    'never hands on %j as a formula',
    (text) => {
      expect(csvCell(text).replace(/^"/, '')).toMatch(/^'/);
    },
  );

  it('keeps negative numbers numbers', () => {
    expect(csvCell(-0.2)).toBe('-0.2');
    expect(csvCell(Number.NaN)).toBe('');
  });

  // RFC 4180, section 2: quotes doubled, CRLF at the end.
  it('quotes as RFC 4180 says', () => {
    expect(csvLine(['a,b', 'say "so"', null, 3, true])).toBe('"a,b","say ""so""",,3,yes\r\n');
  });
});

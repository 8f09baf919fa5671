import { describe, expect, it } from 'vitest';
import { problemOf } from '#server/http/error-handler.ts';
import { withoutToken } from '#server/http/log-requests.ts';
import { conflict, stale } from '#server/http/problem.ts';

describe('problemOf', () => {
  it('keeps what a handler threw', () => {
    expect(problemOf(stale({ version: 4 }))?.toBody()).toMatchObject({
      type: 'tag:upstand.example,2026:version.stale',
      status: 412,
      code: 'version.stale',
      current: { version: 4 },
      errors: [],
    });
  });

  it('does not let a member of its own be overwritten', () => {
    expect(conflict('x', 'y', { extra: { status: 200 } }).toBody().status).toBe(409);
  });

  it.each([
    [Object.assign(new Error('connect ECONNREFUSED'), { code: 'ECONNREFUSED' })],
    [Object.assign(new Error('terminating connection due to administrator command'), { code: '57P01' })],
    [new Error('query failed', { cause: new Error('Connection terminated unexpectedly') })],
  ])('says that the store is away for %s', (error) => {
    expect(problemOf(error)).toMatchObject({ status: 503, code: 'storage.unreachable' });
  });

  it('says nothing of what it does not know', () => {
    expect(problemOf(new Error('relation "users" does not exist'))).toBeNull();
  });
});

describe('withoutToken', () => {
  it.each([
    ['/api/password-resets/abcDEF', '/api/password-resets/[token]'],
    ['/password-reset/abcDEF?x=1', '/password-reset/[token]?x=1'],
    ['/api/people?q=a', '/api/people?q=a'],
  ])('%s', (url, expected) => {
    expect(withoutToken(url)).toBe(expected);
  });
});

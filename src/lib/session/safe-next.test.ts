import { describe, expect, it } from 'vitest';
import { safeNext } from '#src/lib/session/safe-next.ts';

describe('safeNext', () => {
  it.each([
    ['/register?lot=LK-2291', '/register?lot=LK-2291'],
    [null, '/'],
    ['https://elsewhere.example/', '/'],
    ['//elsewhere.example/', '/'],
    ['/\\elsewhere.example/', '/'],
    ['/sign-in?next=/sign-in', '/'],
  ])('%s goes to %s', (next, expected) => {
    expect(safeNext(next)).toBe(expected);
  });
});

import { describe, expect, it } from 'vitest';
import { hashPassword, verifyPassword } from '#server/auth/hash-password.ts';

describe('hashPassword', () => {
  it('is argon2id at or above the least recommended strength', async () => {
    // OWASP Password Storage Cheat Sheet: argon2id, m=19456 (19 MiB), t=2, p=1.
    expect(await hashPassword('saddle maple ferry 41')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('knows the password again, however its accents were typed', async () => {
    const composed = 'Zw\u00f6lf Zeichen!';
    const decomposed = 'Zwo\u0308lf Zeichen!';
    const hash = await hashPassword(composed);
    expect(await verifyPassword(hash, decomposed)).toBe(true);
    expect(await verifyPassword(hash, 'Zwolf Zeichen!')).toBe(false);
  });

  it('is never right without an account', async () => {
    expect(await verifyPassword(null, 'of no account at all')).toBe(false);
  });

  it('works through more than it does at once', async () => {
    const hash = await hashPassword('saddle maple ferry 41');
    const answers = await Promise.all(
      Array.from({ length: 7 }, (_, index) =>
        verifyPassword(hash, index % 2 ? 'wrong' : 'saddle maple ferry 41'),
      ),
    );
    expect(answers).toEqual([true, false, true, false, true, false, true]);
  });
});

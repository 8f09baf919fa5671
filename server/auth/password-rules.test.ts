import { describe, expect, it } from 'vitest';
import { passwordFault } from '#server/auth/password-rules.ts';

const EMAIL = 'inspector@larkmoor.example';

describe('passwordFault', () => {
  it.each(['saddle maple ferry 41', 'Zwölf Zeichen!', 'tR7-vk2-qP9-mm4'])('takes %s', (password) => {
    expect(passwordFault(password, EMAIL)).toBeNull();
  });

  it.each([
    ['short', 'Use at least 12 characters; this has 5.'],
    ['elevenchars', 'Use at least 12 characters; this has 11.'],
    ['aaaaaaaaaaaaaaa', 'Use more than a few different characters.'],
    ['Inspector-of-poles', 'Do not use your e-mail address in your password.'],
    ['my larkmoor word', 'Do not use your e-mail address in your password.'],
    [
      'Password-1234',
      'This is one of the passwords that are tried first. Choose another, such as four unrelated words.',
    ],
  ])('refuses %s', (password, fault) => {
    expect(passwordFault(password, EMAIL)).toBe(fault);
  });
});

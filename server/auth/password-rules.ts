import { COMMON_PASSWORDS } from '#server/auth/common-passwords.ts';

export const PASSWORD_LEAST = 12;
export const PASSWORD_MOST = 200;

/** What is wrong with a new password, in words for the person who chose it; null when it will do. */
export function passwordFault(password: string, email: string): string | null {
  const length = Array.from(password).length;
  if (length < PASSWORD_LEAST) return `Use at least ${PASSWORD_LEAST} characters; this has ${length}.`;
  if (length > PASSWORD_MOST) return `Use at most ${PASSWORD_MOST} characters.`;
  const plain = password.toLowerCase();
  if (new Set(plain).size < 5) return 'Use more than a few different characters.';
  const [local = '', domain = ''] = email.toLowerCase().split('@');
  const parts = [email.toLowerCase(), local, domain.split('.')[0] ?? ''].filter((part) => part.length >= 4);
  if (parts.some((part) => plain.includes(part))) return 'Do not use your e-mail address in your password.';
  if (COMMON_PASSWORDS.has(plain.replaceAll(/[^a-z0-9]/g, ''))) {
    return 'This is one of the passwords that are tried first. Choose another, such as four unrelated words.';
  }
  return null;
}

import { hash, verify } from '@node-rs/argon2';
import { problem } from '#server/http/problem.ts';

/** The package's `Algorithm` is an ambient const enum, which single-file compilation cannot read. */
const ARGON2ID = 2;
/** argon2id with 19 MiB, two passes, one lane: the least that OWASP's password storage guidance recommends. */
const OPTIONS = { algorithm: ARGON2ID, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const AT_ONCE = 2;
const MOST_WAITING = 100;

let running = 0;
const waiting: (() => void)[] = [];

/** Each hash takes memory and a core; two at once leave room for the requests of people who are signed in. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= MOST_WAITING) {
      throw problem(503, 'sign-in.busy', 'Many people are signing in just now. Try again in a moment.', {
        headers: { 'Retry-After': '5' },
      });
    }
    await new Promise<void>((resolve) => void waiting.push(resolve));
  }
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize('NFKC'), OPTIONS));
}

let unknownHash: Promise<string> | null = null;

/** `hash` null: no such account. The same work is done, so that the time tells nothing. */
export async function verifyPassword(hashed: string | null, password: string): Promise<boolean> {
  unknownHash ??= hashPassword('of no account at all');
  const against = hashed ?? (await unknownHash);
  const right = await inTurn(() => verify(against, password.normalize('NFKC')));
  return right && hashed !== null;
}

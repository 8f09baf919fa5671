import { randomBytes } from 'node:crypto';

/** Tells what one test made from what another did. */
export function unique(): string {
  return randomBytes(4).toString('hex');
}

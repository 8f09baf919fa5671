import { DEMO_STANDARD } from '#shared/standard/demo.ts';

const DAYS = 1_460;
export const FIRST_DAY = Date.UTC(2022, 0, 3);
const DAY_MS = 86_400_000;
export const CODES = Object.keys(DEMO_STANDARD.rules);
export const KINDS = ['set', 'set', 'set', 'set', 'straighten', 'relevel'] as const;
/** Of the findings: a tenth stands by concession, the rest is open, rejected, approved on evidence. */
export const STATES = ['open', 'rejected', 'approved', 'approved', 'concession'] as const;

/** Spread over its range, the same every time. */
export const mixed = (n: number, of: number): number => Math.abs(Math.imul(n + 1, 2_654_435_761)) % of;
export const dayOf = (n: number): string =>
  new Date(FIRST_DAY + mixed(n, DAYS) * DAY_MS).toISOString().slice(0, 10);
export const numberOf = (n: number): string => `S-${String(n + 1).padStart(7, '0')}`;

export function* map<T, U>(list: readonly T[], make: (item: T) => U): Generator<U> {
  for (const item of list) yield make(item);
}

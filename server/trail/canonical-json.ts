import { storableText } from '#server/db/storable-text.ts';

/** JSON with keys in order, so that equal payloads have one text. NUL and lone surrogates, which PostgreSQL refuses, become U+FFFD. */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) => {
    if (typeof part === 'string') return storableText(part);
    if (part === null || typeof part !== 'object' || Array.isArray(part)) return part;
    return Object.fromEntries(Object.entries(part).toSorted(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0)));
  });
}

import { storableText } from '#server/db/storable-text.ts';

/** The same value with text that PostgreSQL takes: a cell can hold NUL or half a character. */
export function storableJson<T>(value: T): T {
  return clean(value) as T;
}

function clean(value: unknown): unknown {
  if (typeof value === 'string') return storableText(value);
  if (Array.isArray(value)) return value.map(clean);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(Object.entries(value).map(([key, one]) => [storableText(key), clean(one)]));
}

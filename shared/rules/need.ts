import type { FindingDraft, LineView } from './types.ts';

/** The query that names a blank field a rule needed. The engine keeps one a field and cell. */
export const unproved = (field: string, extra: Partial<FindingDraft> = {}): FindingDraft => ({
  field,
  measured: null,
  limit: null,
  margin: null,
  unit: null,
  ...extra,
  unproved: field,
});

type Needed<K extends string> =
  | { readonly numbers: Readonly<Record<K, number>>; readonly missing: null }
  | { readonly numbers: null; readonly missing: readonly FindingDraft[] };

/**
 * Numbers that a rule cannot do without, or the drafts to return in their place: `unproved` for each that
 * was left blank or is a word (*not measured*), nothing for one that already has a `record-…` finding.
 */
export const needNumbers = <K extends string>(line: LineView, fields: readonly K[]): Needed<K> => {
  const numbers: Partial<Record<K, number>> = {};
  const lacking: K[] = [];
  for (const field of fields) {
    const value = line.values[field];
    if (typeof value === 'number' && Number.isFinite(value)) numbers[field] = value;
    else lacking.push(field);
  }
  if (lacking.length === 0) return { numbers: numbers as Record<K, number>, missing: null };
  return { numbers: null, missing: lacking.filter((f) => !line.broken.has(f)).map((f) => unproved(f)) };
};

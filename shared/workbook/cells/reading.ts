import type { FieldMeta } from '#shared/records/field-meta.ts';
import type { Scalar } from '#shared/records/types.ts';

/**
 * Why a value cannot be read. One sentence for each stands with the findings.
 * number, length, clock, day, degrees, temperature: no such value; separators: decimal comma or mixed marks; fraction: no proper fraction;
 * whole: not whole; boolean: TRUE or FALSE; date-for-number, date-for-text: the program made a date of it; time-only, day-only: half a date-time;
 * no-such-day: 30 February; inches: 12 or more beside feet; hemisphere: N, S, E or W that contradicts the column or the sign; digits-lost: more digits than the program keeps;
 * word: a word that this column does not take.
 */
export const UNREADABLE = [
  'number',
  'length',
  'clock',
  'day',
  'degrees',
  'temperature',
  'separators',
  'fraction',
  'whole',
  'boolean',
  'date-for-number',
  'date-for-text',
  'time-only',
  'day-only',
  'no-such-day',
  'inches',
  'hemisphere',
  'digits-lost',
  'word',
] as const;
export type Unreadable = (typeof UNREADABLE)[number];

export type Problem = {
  readonly code: 'record-unreadable' | 'record-unit' | 'record-code' | 'record-formula';
  readonly params: Readonly<Record<string, Scalar>>;
};

/** Value: what the cell plainly says. Null value: blank. */
export type Reading = { readonly value: string | number | null } | { readonly problem: Problem };

export type ReadField = Pick<FieldMeta, 'read' | 'unit' | 'allowed' | 'words'> & { readonly key: string };

export const value = (read: string | number | null): Reading => ({ value: read });

export const unreadable = (why: Unreadable, params: Problem['params'] = {}): Reading => ({
  problem: { code: 'record-unreadable', params: { why, ...params } },
});

/** The value stands in another unit than the column's: never converted in silence. */
export const wrongUnit = (found: string, expected: string): Reading => ({
  problem: { code: 'record-unit', params: { found, expected } },
});

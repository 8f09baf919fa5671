import type { FieldValues } from '#shared/records/types.ts';

/** A field's number; null when blank, a word, or not finite. */
export function numberOf(values: FieldValues, field: string): number | null {
  const value = Object.hasOwn(values, field) ? values[field] : undefined;
  return typeof value === 'number' && Number.isFinite(value) ? value : null;
}

/** A field's text or code; null when blank or not text. */
export function textOf(values: FieldValues, field: string): string | null {
  const value = Object.hasOwn(values, field) ? values[field] : undefined;
  return typeof value === 'string' && value !== '' ? value : null;
}

/** A field's number above zero; null otherwise. */
export function positiveOf(values: FieldValues, field: string): number | null {
  const value = numberOf(values, field);
  return value !== null && value > 0 ? value : null;
}

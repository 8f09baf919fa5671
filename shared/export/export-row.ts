import type { FieldValues, Scalar } from '#shared/records/types.ts';

export type ExportValue = Scalar | undefined;

/**
 * A row of an as-built by the keys of its columns: what the register knows, before what was handed in. The two are not
 * spread into one: an object of its own shape for each of 50,000 rows is what made memory grow.
 */
export type ExportRow = {
  readonly known: Readonly<Record<string, ExportValue>>;
  readonly written?: FieldValues | null;
};

export function exportValue({ known, written }: ExportRow, key: string): ExportValue {
  if (Object.hasOwn(known, key)) return known[key];
  return written && Object.hasOwn(written, key) ? written[key] : undefined;
}

import type { CheckedRecord } from '#shared/check/types.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { FieldValues, Scalar, SourceRow } from '#shared/records/types.ts';
import type { ValueChange } from './compare.ts';

/** A line's own values and each pour's, under keys that stay the same when rows move. */
type Part = { readonly part: string | null; readonly source: SourceRow; readonly values: FieldValues };

const partsOf = (record: CheckedRecord): ReadonlyMap<string, Part> => {
  const parts = new Map<string, Part>([['', { part: null, source: record.source, values: record.values }]]);
  const seen = new Map<string, number>();
  for (const pour of record.pours) {
    const name = `${pour.event > 1 ? `event ${pour.event}, ` : ''}pour ${pour.pourNumber ?? '?'}`;
    const n = (seen.get(name) ?? 0) + 1;
    seen.set(name, n);
    const part = `${name}, row ${n}`;
    parts.set(part, { part, source: pour.source, values: pour.source.values });
  }
  return parts;
};

const changesOf = (
  record: CheckedRecord,
  before: Part | undefined,
  after: Part | undefined,
): ValueChange[] => {
  const { kind, structureNumber, occurrence } = record;
  const one = after ?? before;
  if (!one) return [];
  const fields = new Set([...Object.keys(before?.values ?? {}), ...Object.keys(after?.values ?? {})]);
  return [...fields].flatMap((field) => {
    const was: Scalar = before?.values[field] ?? null;
    const is: Scalar = after?.values[field] ?? null;
    if (was === is) return [];
    const cell = (after?.source.cells[field] ?? before?.source.cells[field])?.address ?? null;
    return [
      {
        kind,
        structureNumber,
        occurrence,
        field,
        part: one.part,
        before: was,
        after: is,
        sheet: one.source.sheet,
        cell,
      },
    ];
  });
};

/** Values that differ between two checks of one batch. A line that is new or gone is told by its structure number alone. */
export const compareValues = (
  before: readonly CheckedRecord[],
  after: readonly CheckedRecord[],
): readonly ValueChange[] => {
  const key = (record: CheckedRecord): string =>
    lineKey(record.kind, record.structureNumber, record.occurrence);
  const old = new Map(before.map((record) => [key(record), record]));
  const now = new Map(after.map((record) => [key(record), record]));
  const whole = (record: CheckedRecord, gone: boolean): ValueChange => ({
    kind: record.kind,
    structureNumber: record.structureNumber,
    occurrence: record.occurrence,
    field: 'structureNumber',
    part: null,
    before: gone ? record.structureNumber : null,
    after: gone ? null : record.structureNumber,
    sheet: record.sheet,
    cell: record.source.cells['structureNumber']?.address ?? null,
  });
  return [
    ...before.filter((record) => !now.has(key(record))).map((record) => whole(record, true)),
    ...after.flatMap((record) => {
      const earlier = old.get(key(record));
      if (!earlier) return [whole(record, false)];
      const was = partsOf(earlier);
      const is = partsOf(record);
      return [...new Set([...was.keys(), ...is.keys()])].flatMap((part) =>
        changesOf(record, was.get(part), is.get(part)),
      );
    }),
  ];
};

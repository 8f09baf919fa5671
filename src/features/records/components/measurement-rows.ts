import { FIELD_GROUPS } from '#src/features/records/components/field-groups.ts';
import { formatDay, formatWallClock } from '#src/lib/formats.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import { RECORD_FIELDS } from '#shared/records/field-meta.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';

export type MeasurementRow = {
  readonly field: string;
  readonly title: string;
  readonly value: string;
  /** As it stood in the cell, where that differs from what is shown. */
  readonly written: string | null;
  /** `Set!H9`. */
  readonly cell: string | null;
};
export type MeasurementGroup = { readonly title: string; readonly rows: readonly MeasurementRow[] };

type Source = Pick<RecordSheetData, 'cells'> & {
  readonly record: Pick<RecordSheetData['record'], 'kind' | 'sheet' | 'values'>;
};

/** Everything that was written of a line, in groups; a blank field is left out. */
export function measurementGroups({ record, cells }: Source, metric: boolean): readonly MeasurementGroup[] {
  const groups = FIELD_GROUPS[record.kind];
  const named = new Set(groups.flatMap((group) => group.fields));
  const other = [...new Set([...Object.keys(record.values), ...Object.keys(cells)])].filter(
    (field) => !named.has(field),
  );
  return [...groups, { title: 'Other', fields: other }]
    .map(({ title, fields }) => ({
      title,
      rows: fields.flatMap((field) => rowOf({ record, cells }, { field, metric }) ?? []),
    }))
    .filter((group) => group.rows.length > 0);
}

function rowOf(
  { record, cells }: Source,
  { field, metric }: { field: string; metric: boolean },
): MeasurementRow | null {
  const value = record.values[field];
  const cell = cells[field];
  const raw = isCell(cell) ? cell.raw : null;
  if ((value === undefined || value === null) && (raw === null || raw.trim() === '')) return null;
  const meta = RECORD_FIELDS[record.kind].get(field);
  const shown = show(value, meta?.unit ?? null, metric);
  return {
    field,
    title: meta?.title ?? field,
    value: shown ?? 'cannot be read',
    written: raw !== null && raw !== shown && raw.replace(' ', 'T') !== String(value) ? raw : null,
    cell: isCell(cell) ? `${record.sheet}!${cell.address}` : null,
  };
}

function show(value: unknown, unit: string | null, metric: boolean): string | null {
  if (typeof value === 'number')
    return unit === null ? String(value) : formatQuantity(value, unit, { metric });
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value !== 'string') return null;
  if (/^\d{4}-\d{2}-\d{2}T/.test(value)) return formatWallClock(value);
  if (/^\d{4}-\d{2}-\d{2}$/.test(value)) return formatDay(value);
  return /^[a-z]+(-[a-z]+)+$/.test(value) ? value.replaceAll('-', ' ') : value;
}

function isCell(value: unknown): value is { address: string; raw: string } {
  return (
    typeof value === 'object' &&
    value !== null &&
    'address' in value &&
    'raw' in value &&
    typeof value.raw === 'string'
  );
}

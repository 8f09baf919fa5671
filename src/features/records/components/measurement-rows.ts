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

type Source = Pick<RecordSheetData, 'cells' | 'events'> & {
  readonly record: Pick<RecordSheetData['record'], 'kind' | 'sheet' | 'values'>;
};

/** Said by the group's title and the page's. */
const EVENT_HEAD: ReadonlySet<string> = new Set(['structureNumber', 'kind', 'event']);

/** Everything that was written of a line, in groups; a blank field is left out. */
export function measurementGroups(
  { record, cells, events }: Source,
  metric: boolean,
): readonly MeasurementGroup[] {
  const groups = FIELD_GROUPS[record.kind];
  const named = new Set(groups.flatMap((group) => group.fields));
  const other = [...new Set([...Object.keys(record.values), ...Object.keys(cells)])].filter(
    (field) => !named.has(field),
  );
  const written = [...groups, { title: 'Other', fields: other }].map(({ title, fields }) => ({
    title,
    rows: fields.flatMap((field) => rowOf({ record, cells }, { field, metric }) ?? []),
  }));
  return [...written, ...events.map((event) => eventGroup(event, metric))].filter(
    (group) => group.rows.length > 0,
  );
}

/** What a rework or repair left; what was found before it stays as it is above. */
function eventGroup({ event, values }: RecordSheetData['events'][number], metric: boolean): MeasurementGroup {
  const fields = [...RECORD_FIELDS.event].filter(([field]) => !EVENT_HEAD.has(field));
  return {
    title: `Rework or repair, event ${event ?? 'not numbered'}`,
    rows: fields.flatMap(([field, meta]) => {
      const value = show(values[field], meta.unit, metric);
      return value === null ? [] : [{ field, title: meta.title, value, written: null, cell: null }];
    }),
  };
}

function rowOf(
  { record, cells }: Pick<Source, 'record' | 'cells'>,
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

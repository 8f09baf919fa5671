import v1 from '#schemas/workbook/v1.json' with { type: 'json' };
import v2 from '#schemas/workbook/v2.json' with { type: 'json' };
import type { RecordName } from '#shared/generated/validators.mjs';
import { type FieldMeta, RECORD_FIELDS } from '#shared/records/field-meta.ts';
import { unitWord } from '#shared/units/format-quantity.ts';

/** One column of a sheet. */
export type Column = FieldMeta & {
  readonly key: string;
  /** Title with the unit, as the template prints it. */
  readonly heading: string;
  /** The template fills it in from the design: alone it makes no line. */
  readonly prefilled: boolean;
  /** Keys of this and earlier template versions, exactly as they stand in the row of keys. */
  readonly keys: ReadonlySet<string>;
  /** Keys and titles of this and earlier template versions, as nameKey makes them. */
  readonly names: ReadonlySet<string>;
};

export type SheetLayout = {
  readonly name: string;
  readonly record: RecordName;
  readonly columns: readonly Column[];
};

type TemplateSheet = {
  readonly name: string;
  readonly record: string;
  readonly prefilled?: readonly string[];
  readonly titles?: object;
  readonly keys?: object;
};

/** Version that the template carries today, as text on the Batch sheet. */
export const TEMPLATE_VERSION = v2.version;
/** Versions whose workbooks are read. */
export const TEMPLATE_VERSIONS: readonly string[] = [v1.version, v2.version];

export const HEADER_ROWS = { keys: 1, titles: 2, hints: 3, data: 4 } as const;

const LONGEST_HEADING = 300;

/** A heading as it is compared: without its unit in brackets, marks of required columns, case and spacing. */
export function nameKey(heading: string): string {
  // Whatever is longer is no heading of ours, and its brackets need not be looked for.
  if (heading.length > LONGEST_HEADING) return '';
  return heading
    .replace(/\([^()]*\)\s*\*?\s*$/, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, '');
}

/** Title with its unit: `Bore depth (ft)`. */
export function heading(title: string, unit: string | null): string {
  const word = unit === null ? '' : unitWord(unit);
  return word === '' ? title : `${title} (${word})`;
}

function earlierName(names: object | undefined, field: string): string[] {
  const name: unknown = new Map<string, unknown>(Object.entries(names ?? {})).get(field);
  return typeof name === 'string' ? [name] : [];
}

function layoutOf(sheet: TemplateSheet): SheetLayout {
  const record = sheet.record as RecordName;
  const earlier: TemplateSheet | undefined = v1.sheets.find((one) => one.record === sheet.record);
  const columns = [...RECORD_FIELDS[record]].map(([key, meta]): Column => {
    const keys = [key, ...earlierName(earlier?.keys, key)];
    return {
      ...meta,
      key,
      heading: heading(meta.title, meta.unit),
      prefilled: sheet.prefilled?.includes(key) ?? false,
      keys: new Set(keys),
      names: new Set([...keys, meta.title, ...earlierName(earlier?.titles, key)].map(nameKey)),
    };
  });
  return { name: sheet.name, record, columns };
}

/** Sheets of the current template in their order; columns in the order of the record's schema. */
export const LAYOUT: readonly SheetLayout[] = v2.sheets.map(layoutOf);

/** Layout of one record's sheet. */
export function sheetLayout(record: RecordName): SheetLayout {
  return LAYOUT.find((sheet) => sheet.record === record)!;
}

/** Layout of a sheet by its name, whatever its case and hyphens; null for other sheets. */
export function layoutByName(name: string): SheetLayout | null {
  return LAYOUT.find((sheet) => nameKey(sheet.name) === nameKey(name)) ?? null;
}

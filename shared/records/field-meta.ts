import batch from '#schemas/records/batch/v1.schema.json' with { type: 'json' };
import event from '#schemas/records/event/v1.schema.json' with { type: 'json' };
import photo from '#schemas/records/photo/v1.schema.json' with { type: 'json' };
import pour from '#schemas/records/pour/v1.schema.json' with { type: 'json' };
import relevel from '#schemas/records/relevel/v1.schema.json' with { type: 'json' };
import set from '#schemas/records/set/v1.schema.json' with { type: 'json' };
import straighten from '#schemas/records/straighten/v1.schema.json' with { type: 'json' };
import type { RecordName } from '#shared/generated/validators.mjs';

/** What a record's schema says of one field. */
export type FieldMeta = {
  readonly title: string;
  readonly description: string;
  readonly unit: string | null;
  readonly minimum: number | null;
  readonly maximum: number | null;
  readonly maxLength: number | null;
  /** Codes allowed; null where any text or number is. */
  readonly allowed: readonly string[] | null;
  /** Words allowed in place of a value. */
  readonly words: readonly string[];
  /** How the cell is read: `length-in`, `clock` … */
  readonly read: string;
  readonly required: boolean;
};

type Property = {
  readonly title?: string;
  readonly description?: string;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly maxLength?: number;
  readonly enum?: readonly string[];
  readonly 'x-unit'?: string;
  readonly 'x-words'?: readonly string[];
  readonly 'x-read'?: string;
};
type RecordSchema = { readonly properties: object; readonly required?: readonly string[] };

const metaOf = (field: string, property: Property, required: ReadonlySet<string>): FieldMeta => ({
  title: property.title ?? field,
  description: property.description ?? '',
  unit: property['x-unit'] ?? null,
  minimum: property.minimum ?? null,
  maximum: property.maximum ?? null,
  maxLength: property.maxLength ?? null,
  allowed: property.enum ?? null,
  words: property['x-words'] ?? [],
  read: property['x-read'] ?? 'text',
  required: required.has(field),
});

const fieldsOf = (schema: RecordSchema): ReadonlyMap<string, FieldMeta> => {
  const required = new Set(schema.required ?? []);
  const properties = Object.entries(schema.properties as Readonly<Record<string, Property>>);
  return new Map(properties.map(([field, property]) => [field, metaOf(field, property, required)]));
};

/** Fields of each record in the order of its sheet. */
export const RECORD_FIELDS: Readonly<Record<RecordName, ReadonlyMap<string, FieldMeta>>> = {
  set: fieldsOf(set),
  straighten: fieldsOf(straighten),
  relevel: fieldsOf(relevel),
  pour: fieldsOf(pour),
  event: fieldsOf(event),
  photo: fieldsOf(photo),
  batch: fieldsOf(batch),
};

/** A field's title in sentences and tables; its key where no schema knows it. */
export const fieldTitle = (record: RecordName, field: string): string =>
  RECORD_FIELDS[record].get(field)?.title ?? field;

import { classTableOf } from './class-table.ts';
import { numberOf, textOf } from './values.ts';
import type { FieldFault } from './field-fault.ts';
import type { FieldValues } from '#shared/records/types.ts';

const NOT_WOOD = new Set(['steel', 'concrete', 'composite']);

const missing = (field: string): FieldFault => ({
  field,
  keyword: 'required',
  params: { missingProperty: field, because: 'not-in-class-table' },
});

const given = (values: FieldValues, fields: readonly string[]) =>
  fields.some((field) => values[field] !== undefined && values[field] !== null);

/** What a wood pole needs taped because the class table lacks it. Poles that are not wood, and blank fields, are the schema's matter. */
function untaped(values: FieldValues, ends: readonly (readonly string[])[]): FieldFault[] {
  const material = textOf(values, 'poleMaterial');
  if (material === null || NOT_WOOD.has(material) || classTableOf(values) !== null) return [];
  return ends.flatMap((fields) => (given(values, fields) ? [] : [missing(fields[0] ?? '')]));
}

/** A part that is larger than its whole. */
function larger(values: FieldValues, { field, than }: { field: string; than: string }): FieldFault[] {
  const part = numberOf(values, field);
  const limit = numberOf(values, than);
  if (part === null || limit === null || part <= limit) return [];
  return [{ field, keyword: 'maximum', params: { comparison: '<=', limit, of: than } }];
}

const GROUND_LINE = ['girthGroundLineIn', 'diameterGroundLineIn'] as const;
const BUTT = ['girthButtIn', 'diameterButtIn'] as const;

/** Faults that hang on the class table or on two numbers, which JSON Schema cannot say. Total on any input. */
export function crossFaults(kind: string, value: unknown): FieldFault[] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return [];
  const values = value as FieldValues;
  switch (kind) {
    case 'set': {
      // Without length or class the schema already asks for them.
      if (values.poleLengthFt === undefined || values.poleClass === undefined) return [];
      return untaped(values, [GROUND_LINE, BUTT]);
    }
    case 'straighten':
      return untaped(values, [GROUND_LINE]);
    case 'relevel':
      return [
        ...larger(values, { field: 'openingLengthIn', than: 'padLengthIn' }),
        ...larger(values, { field: 'openingWidthIn', than: 'padWidthIn' }),
      ];
    case 'pour':
      return larger(values, { field: 'wastedQuantity', than: 'quantity' });
    default:
      return [];
  }
}

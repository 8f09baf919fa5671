import { batch, event, photo, pour, product, relevel, set, standard, straighten } from 'compiled-schemas';
import { crossFaults } from '#shared/calc/cross-faults.ts';
import type { FieldFault } from '#shared/calc/field-fault.ts';

type Validate = typeof set;
type Fault = NonNullable<Validate['errors']>[number];

const RECORDS = { set, straighten, relevel, pour, event, photo, batch } as const;

/** Which of several faults of one field says most; the rest follow from it. */
const TELLING = [
  'required',
  'dependentRequired',
  'additionalProperties',
  'minimum',
  'exclusiveMinimum',
  'maximum',
  'exclusiveMaximum',
  'maxLength',
  'minLength',
  'enum',
  'pattern',
];

function rank(keyword: string): number {
  const at = TELLING.indexOf(keyword);
  return at < 0 ? TELLING.length : at;
}

function fieldOf(fault: Fault): string | null {
  const path = fault.instancePath
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'));
  const named = fault.params.missingProperty ?? fault.params.additionalProperty;
  if (typeof named === 'string') path.push(named);
  return path.length === 0 ? null : path.join('.');
}

function tell(faults: readonly FieldFault[]): FieldFault[] {
  const best = new Map<string | null, FieldFault>();
  for (const fault of faults) {
    const held = best.get(fault.field);
    if (held === undefined || rank(fault.keyword) < rank(held.keyword)) best.set(fault.field, fault);
  }
  return [...best.values()];
}

function run(validate: Validate, value: unknown): FieldFault[] {
  if (validate(value)) return [];
  return (validate.errors ?? [])
    .filter((fault) => fault.keyword !== 'if')
    .map((fault) => ({ field: fieldOf(fault), keyword: fault.keyword, params: fault.params }));
}

export type RecordName = keyof typeof RECORDS;

/** Faults of one row against its schema and against what a schema cannot say (the class table); one a field, in the schema's words. */
export function validateRecord(kind: RecordName, values: unknown): FieldFault[] {
  return tell([...run(RECORDS[kind], values), ...crossFaults(kind, values)]);
}

export function validateStandard(value: unknown): FieldFault[] {
  return tell(run(standard, value));
}

export function validateProduct(value: unknown): FieldFault[] {
  return tell(run(product, value));
}

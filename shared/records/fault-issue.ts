import type { FieldFault } from '#shared/generated/validators.mjs';
import { conditionOf } from './conditions.ts';
import type { FieldMeta } from './field-meta.ts';
import { expectedParams, type RecordIssue } from './record-issue.ts';
import type { Scalar } from './types.ts';

const RANGE: ReadonlySet<string> = new Set(['minimum', 'exclusiveMinimum', 'maximum', 'exclusiveMaximum']);
/** Codes that go with the rest of the row, where a condition leaves only some of the list. */
const allowedHere = ({ params }: FieldFault): { readonly allowed?: readonly string[] } => {
  const allowed = params['allowedValues'];
  return Array.isArray(allowed) ? { allowed: allowed.map(String) } : {};
};

/** A fault of a field in the schema's words as an issue of the record. */
export const faultIssue = (fault: FieldFault, field: string, meta: FieldMeta, value: Scalar): RecordIssue => {
  const params = expectedParams(meta);
  const plain = { field, measured: value, limit: null, margin: null, unit: null, params };
  if (fault.keyword === 'required' || fault.keyword === 'dependentRequired') {
    if (meta.required) return { ...plain, code: 'record-missing' };
    const condition = conditionOf(field, fault.params['because']);
    return { ...plain, code: 'record-conditional', params: { ...params, condition } };
  }
  if (RANGE.has(fault.keyword) && typeof value === 'number') {
    const limit = Number(fault.params['limit']);
    const least = fault.keyword === 'minimum' || fault.keyword === 'exclusiveMinimum';
    const margin = least ? value - limit : limit - value;
    const other = fault.params['of'];
    const bound = typeof other === 'string' ? { ...params, of: other } : params;
    return { ...plain, code: 'record-range', limit, margin, unit: meta.unit, params: bound };
  }
  if (fault.keyword === 'enum' || fault.keyword === 'const') {
    // A code that is allowed as such does not go with the rest of the row.
    if (typeof value === 'string' && meta.allowed?.includes(value) === true)
      return {
        ...plain,
        code: 'record-conditional',
        params: { ...params, condition: conditionOf(field, null), ...allowedHere(fault) },
      };
    return { ...plain, code: 'record-code' };
  }
  if (fault.keyword === 'pattern') return { ...plain, code: 'record-unreadable' };
  if (fault.keyword === 'maxLength' || fault.keyword === 'minLength')
    return { ...plain, code: 'record-length' };
  return { ...plain, code: 'record-type' };
};

import type { FieldFault, RecordName } from '#shared/generated/validators.mjs';
import { validateRecord } from '#shared/generated/validators.mjs';
import { ALTERNATIVE } from './conditions.ts';
import { faultIssue } from './fault-issue.ts';
import { RECORD_FIELDS } from './field-meta.ts';
import { problemIssue } from './problem-issue.ts';
import { expectedParams, type RecordIssue } from './record-issue.ts';
import type { FieldValues, Scalar, SourceRow } from './types.ts';

/** A row whose values all satisfy its schema; what did not is an issue and no longer a value. */
export type CleanRow = {
  readonly source: SourceRow;
  readonly values: FieldValues;
  /** Fields with an issue. */
  readonly broken: ReadonlySet<string>;
  readonly issues: readonly RecordIssue[];
};

/** Fields that choose the row of the class table: an unreadable one explains why the pole is not in it. */
const CLASS_TABLE_FIELDS = ['poleLengthFt', 'poleClass', 'poleMaterial'] as const;

const isScalar = (value: unknown): value is Scalar =>
  typeof value === 'string' ||
  typeof value === 'boolean' ||
  (typeof value === 'number' && Number.isFinite(value));

/** Takes a row's values to what its schema allows. Total: whatever stands in the row, nothing is thrown. */
export const cleanRow = (source: SourceRow, record: RecordName): CleanRow => {
  const fields = RECORD_FIELDS[record];
  const issues = source.problems.map((problem) => problemIssue(problem, fields.get(problem.field)));
  const broken = new Set(source.problems.map((problem) => problem.field));
  const values: Record<string, Scalar> = {};
  for (const [field, meta] of fields) {
    const value: unknown = Object.hasOwn(source.values, field) ? source.values[field] : null;
    if (broken.has(field) || value === null || value === undefined || value === '') continue;
    // Minus zero is zero, and JSON would lose its sign.
    if (isScalar(value)) values[field] = value === 0 ? 0 : value;
    else {
      broken.add(field);
      issues.push({
        code: 'record-type',
        field,
        measured: null,
        limit: null,
        margin: null,
        unit: null,
        params: expectedParams(meta),
      });
    }
  }
  const faults = validateRecord(record, values);
  const faulty = new Set(faults.map((fault) => fault.field));
  const explained = (fault: FieldFault, field: string): boolean => {
    if (broken.has(field)) return true;
    const alternative = ALTERNATIVE[field];
    if (fault.keyword === 'required' && alternative !== undefined && broken.has(alternative)) return true;
    const unknownPole = CLASS_TABLE_FIELDS.some((one) => broken.has(one) || faulty.has(one));
    return fault.params['because'] === 'not-in-class-table' && unknownPole;
  };
  const found = faults.flatMap((fault) => {
    const meta = fault.field === null ? undefined : fields.get(fault.field);
    if (fault.field === null || !meta || explained(fault, fault.field)) return [];
    return [faultIssue(fault, fault.field, meta, values[fault.field] ?? null)];
  });
  for (const issue of found) {
    if (issue.field === null) continue;
    broken.add(issue.field);
    delete values[issue.field];
  }
  return { source, values, broken, issues: [...issues, ...found] };
};

import type { FieldMeta } from './field-meta.ts';
import { expectedParams, type RecordIssue } from './record-issue.ts';
import type { CellProblem } from './types.ts';

/** A cell that the reader could not make a value of, with what its field expects. */
export const problemIssue = (problem: CellProblem, meta: FieldMeta | undefined): RecordIssue => ({
  code: problem.code,
  field: problem.field,
  measured: problem.raw,
  limit: null,
  margin: null,
  unit: null,
  params: { ...problem.params, ...expectedParams(meta) },
});

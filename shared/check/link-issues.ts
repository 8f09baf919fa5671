import type { Severity } from '#shared/findings/types.ts';
import { RECORD_FIELDS } from '#shared/records/field-meta.ts';
import { conditionOf } from '#shared/records/conditions.ts';
import { expectedParams, type RecordIssue } from '#shared/records/record-issue.ts';
import type { CleanRow } from '#shared/records/clean-row.ts';

const plain = { limit: null, margin: null, unit: null };
const STRUCTURE = expectedParams(RECORD_FIELDS.pour.get('structureNumber'));

/** A row of a structure that stands on two kinds' sheets and does not say for which it is. */
export const ambiguousKind = (row: CleanRow): RecordIssue => ({
  ...plain,
  code: 'record-conditional',
  field: 'kind',
  measured: row.values['kind'] ?? null,
  params: { ...expectedParams(RECORD_FIELDS.pour.get('kind')), condition: conditionOf('kind', null) },
});

/** A second row for one event of one line: only one can hold its times. */
export const duplicateEvent = (row: CleanRow): RecordIssue => ({
  ...plain,
  code: 'record-duplicate',
  field: 'event',
  measured: row.values['event'] ?? null,
  params: expectedParams(RECORD_FIELDS.event.get('event')),
});

/** An event or a photograph of a structure that has no line here. A photograph may still be placed by hand. */
export const orphanRow = (row: CleanRow, severity?: Severity): RecordIssue => ({
  ...plain,
  code: 'record-orphan',
  ...(severity ? { severity } : {}),
  field: 'structureNumber',
  measured: row.values['structureNumber'] ?? null,
  params: STRUCTURE,
});

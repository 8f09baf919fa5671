import type { Kind } from '#shared/records/types.ts';
import { sheetLayout } from '#shared/workbook/layout.ts';

/** `clock` and `day` are written as real dates; `text` never as a formula. */
export type ExportColumn = {
  readonly key: string;
  readonly heading: string;
  readonly hint: string;
  readonly type: 'text' | 'number' | 'clock' | 'day';
};

const column = (key: string, heading: string, type: ExportColumn['type'], hint = ''): ExportColumn => ({
  key,
  heading,
  type,
  hint,
});

const HEAD: readonly ExportColumn[] = [
  column('recordNumber', 'Record', 'text', 'Number on the register'),
  column('version', 'Version', 'number', 'Of the record; the newest supersedes'),
];
const TAIL: readonly ExportColumn[] = [
  column('voidFt3', 'Void (ft³)', 'number', 'Computed from the measurements'),
  column('placedFt3', 'Foam placed (ft³)', 'number', 'Kits less wasted, at their temperature'),
  column('fillRatio', 'Fill ratio', 'number', 'Foam placed over void'),
  column('fillRatioU', 'Fill ratio U (k = 2)', 'number', 'Expanded uncertainty'),
  column('dueFt', 'Embedment due (ft)', 'number', 'By the standard of the work day'),
  column('waterWithPoleIn', 'Water with the pole in (in)', 'number'),
  column('leastAnnulusIn', 'Least annulus (in)', 'number'),
  column('conforms', 'Conforms', 'text', 'no: accepted by concession'),
  column('concessions', 'Concessions', 'text'),
  column('standard', 'Standard', 'number', 'Version in force on the work day'),
  column('contractor', 'Contractor', 'text'),
  column('workOrder', 'Work order', 'text'),
  column('batch', 'Batch', 'text'),
  column('revision', 'Revision', 'number'),
  column('photographs', 'Photographs', 'number'),
  column('enteredOn', 'Entered on record', 'day'),
];

function fieldColumns(record: Kind | 'pour' | 'event'): ExportColumn[] {
  return sheetLayout(record).columns.map((field) => ({
    key: field.key,
    heading: field.heading,
    hint: field.description,
    type:
      field.read === 'clock' || field.read === 'day'
        ? field.read
        : ['text', 'code'].includes(field.read)
          ? 'text'
          : 'number',
  }));
}

/** What is computed of a pole in a bore alone. */
const NOT_OF: Readonly<Record<Kind, readonly string[]>> = {
  set: [],
  straighten: ['dueFt', 'leastAnnulusIn'],
  relevel: ['dueFt', 'leastAnnulusIn', 'waterWithPoleIn'],
};

/** Columns of a kind's sheet in an issued as-built: the record as handed in, then what was computed and decided. */
export const kindColumns = (kind: Kind): readonly ExportColumn[] => [
  ...HEAD,
  ...fieldColumns(kind),
  ...TAIL.filter(({ key }) => !NOT_OF[kind].includes(key)),
];

export const POUR_COLUMNS: readonly ExportColumn[] = [HEAD[0] as ExportColumn, ...fieldColumns('pour')];

/** Rework and repair: what was done after the first time, event by event. */
export const EVENT_COLUMNS: readonly ExportColumn[] = [HEAD[0] as ExportColumn, ...fieldColumns('event')];

export const FINDING_COLUMNS: readonly ExportColumn[] = [
  HEAD[0] as ExportColumn,
  column('structureNumber', 'Structure', 'text'),
  column('code', 'Rule', 'text'),
  column('title', 'Finding', 'text'),
  column('severity', 'Severity', 'text'),
  column('measured', 'Measured', 'text'),
  column('limit', 'Limit', 'text'),
  column('margin', 'Margin', 'number', 'Negative fails'),
  column('unit', 'Unit', 'text'),
  column('sentence', 'What was found', 'text'),
  column('decision', 'Decision', 'text'),
  column('grounds', 'Grounds', 'text'),
  column('reason', 'Reason', 'text'),
  column('decidedBy', 'Decided by', 'text'),
  column('concession', 'Concession', 'text'),
  column('condition', 'Condition', 'text'),
  column('endsOn', 'Ends on', 'day'),
];

import type { DataColumn } from '#src/components/table/columns.ts';
import { Day } from '#src/components/ui/moment.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { SEVERITY_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { kindWord } from '#src/lib/filters/rule-options.ts';
import type { Nonconformity } from '#shared/generated/api-types.ts';
import { ComparedValue } from './compared-value.tsx';
import { actionDue, NonconformityState } from './nonconformity-state.tsx';

export const NONCONFORMITY_COLUMNS: readonly DataColumn<Nonconformity>[] = [
  {
    id: 'structure',
    title: 'Structure',
    min: 4.8,
    grow: 0.1,
    main: true,
    cell: (row) => row.structureNumber ?? `batch ${row.batch.number}`,
  },
  {
    id: 'rule',
    title: 'Rule',
    min: 7,
    grow: 8,
    cell: (row) => <span title={row.message}>{row.title}</span>,
  },
  {
    id: 'measured',
    title: 'Measured',
    figures: true,
    min: 6.2,
    grow: 0.1,
    cell: (row) => <ComparedValue value={row.measured} unit={row.unit} plusMinus={row.uncertainty} />,
  },
  {
    id: 'limit',
    title: 'Limit',
    figures: true,
    min: 5,
    grow: 6.3,
    // A word alone, as of the view that a missing photograph should show, is no limit.
    cell: (row) => (
      <ComparedValue
        value={row.measured === null && typeof row.limit === 'string' ? null : row.limit}
        unit={row.unit}
      />
    ),
  },
  {
    id: 'margin',
    title: 'Margin',
    figures: true,
    min: 5,
    grow: 7.2,
    cell: (row) =>
      row.margin === null ? (
        <span className="text-muted">–</span>
      ) : (
        <Quantity value={row.margin} unit={row.unit ?? ''} margin />
      ),
  },
  {
    id: 'severity',
    title: 'Severity',
    min: 9,
    off: true,
    cell: (row) => <StateWord {...SEVERITY_WORDS[row.severity]} />,
  },
  { id: 'state', title: 'State', min: 9.2, grow: 0.1, cell: (row) => <NonconformityState row={row} /> },
  {
    id: 'due',
    title: 'Action due',
    min: 6,
    grow: 7.5,
    cell: (row) => <span title={actionDue(row)}>{actionDue(row)}</span>,
  },
  { id: 'contractor', title: 'Contractor', min: 5.6, grow: 10.3, cell: (row) => row.contractor.name },
  { id: 'lot', title: 'Lot', min: 4.8, grow: 0.1, cell: (row) => row.lots.join(', ') || '–' },
  {
    id: 'installed',
    title: 'Installed',
    figures: true,
    min: 5.9,
    grow: 0.1,
    cell: (row) => (row.installedOn ? <Day on={row.installedOn} /> : 'not known'),
  },
  { id: 'by', title: 'Decided by', min: 5.2, grow: 0.1, cell: (row) => row.decidedBy ?? '–' },
  { id: 'kind', title: 'Kind', min: 5, off: true, cell: (row) => (row.kind ? kindWord(row.kind) : '–') },
  { id: 'order', title: 'Work order', min: 5, off: true, cell: (row) => row.workOrder.number },
  {
    id: 'batch',
    title: 'Batch',
    min: 6,
    off: true,
    cell: (row) => `${row.batch.number} rev ${row.batch.revision}`,
  },
  { id: 'record', title: 'Record', min: 6, off: true, cell: (row) => row.recordNumber ?? 'not on record' },
];

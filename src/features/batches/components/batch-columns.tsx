import type { DataColumn } from '#src/components/table/columns.ts';
import { Age } from '#src/components/ui/age.tsx';
import { STATUS_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { formatCount, formatDay } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

/** Since when it waits: for the owner since it was handed in, for the contractor since it was begun. */
const since = ({ revision, createdAt }: Batch): string => revision.submittedAt ?? createdAt;

export const BATCH_COLUMNS: readonly DataColumn<Batch>[] = [
  { id: 'number', title: 'Batch', main: true, min: 6, grow: 0.5, cell: (row) => row.number },
  {
    id: 'status',
    title: 'State',
    min: 11,
    cell: (row) => <StateWord {...STATUS_WORDS[row.status]} />,
  },
  {
    id: 'order',
    title: 'Work order',
    min: 12,
    grow: 2,
    cell: (row) => `${row.workOrder.number} · ${row.workOrder.title}`,
  },
  { id: 'contractor', title: 'Contractor', min: 10, cell: (row) => row.contractor.name },
  { id: 'revision', title: 'Revision', figures: true, min: 5, grow: 0, cell: (row) => row.revision.number },
  {
    id: 'lines',
    title: 'Lines',
    figures: true,
    min: 4,
    grow: 0,
    cell: (row) => formatCount(row.counts.lines),
  },
  {
    id: 'nonconformity',
    title: 'Nonconf.',
    figures: true,
    min: 5,
    grow: 0,
    cell: (row) => formatCount(row.counts.nonconformity),
  },
  {
    id: 'query',
    title: 'Queries',
    figures: true,
    min: 4,
    grow: 0,
    cell: (row) => formatCount(row.counts.query),
  },
  {
    id: 'photos',
    title: 'Photographs',
    figures: true,
    min: 6,
    grow: 0,
    cell: (row) => formatCount(row.counts.photos),
  },
  {
    id: 'due',
    title: 'Due',
    min: 7,
    grow: 0,
    cell: (row) =>
      row.revision.dueOn ? formatDay(row.revision.dueOn) : <span className="text-muted">none</span>,
  },
  { id: 'age', title: 'Age', figures: true, min: 5, grow: 0, cell: (row) => <Age since={since(row)} /> },
];

import type { DataColumn } from '#src/components/table/columns.ts';
import { Moment } from '#src/components/ui/moment.tsx';
import { formatCount } from '#src/lib/formats.ts';
import type { Transmittal } from '#shared/generated/api-types.ts';
import { TransmittalState } from './transmittal-state.tsx';

export const TRANSMITTAL_COLUMNS: readonly DataColumn<Transmittal>[] = [
  { id: 'number', title: 'Transmittal', min: 6, main: true, cell: (row) => row.number },
  { id: 'revision', title: 'Revision', min: 4, figures: true, cell: (row) => row.revision },
  { id: 'title', title: 'Title', min: 14, grow: 3, cell: (row) => row.title },
  { id: 'state', title: 'State', min: 10, cell: (row) => <TransmittalState state={row.state} /> },
  { id: 'rows', title: 'Records', min: 4.5, figures: true, cell: (row) => formatCount(row.rows) },
  { id: 'by', title: 'Asked for by', min: 7, cell: (row) => row.requestedBy },
  {
    id: 'issued',
    title: 'Issued',
    min: 9.5,
    cell: (row) =>
      row.issuedAt ? <Moment at={row.issuedAt} /> : <span className="text-muted">not yet</span>,
  },
  { id: 'asked', title: 'Asked for', min: 9.5, off: true, cell: (row) => <Moment at={row.requestedAt} /> },
  {
    id: 'sha',
    title: 'SHA-256 of the file',
    min: 10,
    off: true,
    cell: (row) => (row.sha256 ? <span title={row.sha256}>{row.sha256.slice(0, 16)}…</span> : '–'),
  },
];

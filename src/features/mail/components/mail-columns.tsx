import type { DataColumn } from '#src/components/table/columns.ts';
import { Address } from '#src/components/ui/address.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import type { CapturedMail } from '#shared/generated/api-types.ts';

export const MAIL_COLUMNS: readonly DataColumn<CapturedMail>[] = [
  { id: 'subject', title: 'Subject', min: 18, grow: 3, main: true, cell: (row) => row.subject },
  { id: 'to', title: 'To', min: 14, grow: 2, cell: (row) => <Address>{row.recipients.join(', ')}</Address> },
  { id: 'from', title: 'From', min: 12, grow: 1.5, off: true, cell: (row) => row.sender },
  { id: 'at', title: 'When', min: 10, cell: (row) => <Moment at={row.at} /> },
];

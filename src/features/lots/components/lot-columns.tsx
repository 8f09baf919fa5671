import type { DataColumn } from '#src/components/table/columns.ts';
import { Figure } from '#src/components/ui/figure.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { formatCount } from '#src/lib/formats.ts';
import type { Lot } from '#shared/generated/api-types.ts';
import { Expiry, LotStatus } from './lot-words.tsx';

export const LOT_COLUMNS: readonly DataColumn<Lot>[] = [
  { id: 'number', title: 'Lot', min: 6, main: true, cell: (row) => row.number },
  { id: 'product', title: 'Product', min: 5, cell: (row) => row.product.code },
  { id: 'status', title: 'State', min: 6, cell: (row) => <LotStatus status={row.status} /> },
  {
    id: 'received',
    title: 'Received',
    unit: 'ft3',
    figures: true,
    min: 7,
    cell: (row) => <Figure value={row.receivedFt3} unit="ft3" />,
  },
  {
    id: 'used',
    title: 'Used',
    unit: 'ft3',
    figures: true,
    min: 6,
    cell: (row) => <Figure value={row.usedFt3} unit="ft3" />,
  },
  {
    id: 'balance',
    title: 'Balance',
    figures: true,
    min: 7,
    cell: (row) => <Quantity value={row.balanceFt3} unit="ft3" margin />,
  },
  {
    id: 'structures',
    title: 'Structures',
    figures: true,
    min: 5.5,
    cell: (row) => formatCount(row.structures),
  },
  { id: 'expires', title: 'Expires', min: 10, grow: 1.5, cell: (row) => <Expiry on={row.expiresOn} /> },
];

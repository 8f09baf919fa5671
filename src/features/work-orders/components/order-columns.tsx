import { PlanProgress } from './plan-progress.tsx';
import type { DataColumn } from '#src/components/table/columns.ts';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { formatCount } from '#src/lib/formats.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

const count = (id: string, title: string, of: (row: WorkOrder) => number): DataColumn<WorkOrder> => ({
  id,
  title,
  figures: true,
  min: 5,
  grow: 0,
  cell: (row) => formatCount(of(row)),
});

export const ORDER_COLUMNS: readonly DataColumn<WorkOrder>[] = [
  { id: 'number', title: 'Work order', main: true, min: 5.5, grow: 0.4, cell: (row) => row.number },
  { id: 'title', title: 'Title', min: 12, grow: 2, cell: (row) => row.title },
  { id: 'contractor', title: 'Contractor', min: 11, grow: 1.5, cell: (row) => row.contractor.name },
  count('structures', 'Structures', (row) => row.structures),
  count('planned', 'Planned', (row) => row.progress.planned),
  count('inBatch', 'In batch', (row) => row.progress.inBatch),
  count('approved', 'Approved', (row) => row.progress.approved),
  { id: 'progress', title: 'Progress', min: 20, grow: 0, cell: (row) => <PlanProgress order={row} /> },
  {
    id: 'open',
    title: 'Open batch',
    min: 6,
    grow: 0,
    cell: (row) =>
      row.openBatch ? (
        <TextLink to={paths.batch.to(row.openBatch)}>continue</TextLink>
      ) : (
        <span className="text-muted">none</span>
      ),
  },
];

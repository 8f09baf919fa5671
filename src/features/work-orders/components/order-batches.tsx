import { useQuery } from '@tanstack/react-query';
import { orderBatchesQuery } from '../api/order-batches.ts';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { STATUS_WORDS, StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { formatDay } from '#src/lib/formats.ts';
import type { Batch } from '#shared/generated/api-types.ts';

const COLUMNS: readonly PlainColumn<Batch>[] = [
  {
    id: 'number',
    title: 'Batch',
    cell: (row) => (
      <TextLink
        to={paths.batch.to(row.id)}
        className="font-semibold pointer-coarse:inline-block pointer-coarse:py-2"
      >
        {row.number}
      </TextLink>
    ),
  },
  { id: 'status', title: 'State', cell: (row) => <StateWord {...STATUS_WORDS[row.status]} /> },
  { id: 'revision', title: 'Revision', figures: true, cell: (row) => row.revision.number },
  { id: 'lines', title: 'Lines', figures: true, cell: (row) => row.counts.lines },
  { id: 'decided', title: 'Decided', figures: true, cell: (row) => row.counts.decided },
  { id: 'nc', title: 'Nonconformities', figures: true, cell: (row) => row.counts.nonconformity },
  { id: 'query', title: 'Queries', figures: true, cell: (row) => row.counts.query },
  { id: 'photos', title: 'Photographs', figures: true, cell: (row) => row.counts.photos },
  { id: 'due', title: 'Due', cell: (row) => (row.revision.dueOn ? formatDay(row.revision.dueOn) : 'none') },
];

export function OrderBatches({ orderId }: { orderId: string }) {
  const batches = useQuery(orderBatchesQuery(orderId));
  if (batches.isPending) return <Skeleton lines={3} />;
  if (batches.isError) {
    return <ErrorState error={batches.error} what="The batches" onRetry={() => void batches.refetch()} />;
  }
  if (batches.data.length === 0) {
    return (
      <EmptyState title="No batches of this work order yet">
        A batch is opened by the contractor, and takes one workbook and its photographs.
      </EmptyState>
    );
  }
  return (
    <PlainTable
      caption="Batches of this work order"
      columns={COLUMNS}
      rows={batches.data}
      rowKey={(row) => row.id}
    />
  );
}

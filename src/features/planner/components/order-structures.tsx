import { memo } from 'react';
import { PLANNED_COLUMNS, type PlannedRow } from './order-columns.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';

type Props = {
  readonly rows: readonly PlannedRow[];
  readonly rowTo: (row: PlannedRow) => string;
};

const IDLE = {
  isStale: false,
  hasMore: false,
  isLoadingMore: false,
  isPending: false,
  error: null,
  loadMore: () => undefined,
  refetch: () => undefined,
};

/** Every structure of the order with its kits; a row leads to its own plan. */
export const OrderStructures = memo(function OrderStructures({ rows, rowTo }: Props) {
  const columns = useColumns<PlannedRow>({
    columns: PLANNED_COLUMNS,
    rows,
    rowKey: (row) => row.structure.id,
    storageKey: 'planner-structures',
  });
  return (
    <DataList
      label="Structures planned"
      list={{ ...IDLE, rows, total: rows.length }}
      columns={columns}
      rowTo={rowTo}
      empty={
        <EmptyState title="Nothing left to plan">
          Every structure of this order is built or handed in. Choose “all of them” to plan them anyway.
        </EmptyState>
      }
    />
  );
});

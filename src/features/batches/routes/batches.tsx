import { useMemo } from 'react';
import { BATCH_COLUMNS } from '../components/batch-columns.tsx';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { STATUS_WORDS } from '#src/components/ui/state-word.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { counted } from '#src/lib/formats.ts';
import { useUser } from '#src/lib/session/session.ts';
import { REVISION_STATUSES } from '#shared/review/states.ts';
import type { Batch } from '#shared/generated/api-types.ts';

const FILTERS = ['status'];
const DEFINE: readonly FilterDefinition[] = [
  {
    name: 'status',
    label: 'State',
    any: 'all',
    options: REVISION_STATUSES.map((status) => ({ value: status, label: STATUS_WORDS[status].word })),
  },
];

export function Component() {
  const user = useUser();
  const filters = useFilters(FILTERS);
  const list = useKeysetList<Batch>({ key: 'batches', path: '/api/batches', query: filters.values });
  const own = user.role === 'contractor';
  const offered = useMemo(() => BATCH_COLUMNS.filter((column) => !own || column.id !== 'contractor'), [own]);
  const columns = useColumns<Batch>({
    columns: offered,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'batches',
  });
  return (
    <>
      <DocumentTitle>Batches</DocumentTitle>
      <PageBand
        title="Batches"
        facts={list.total === null ? null : <Fact>{counted(list.total, 'batch', 'batches')}</Fact>}
        actions={<ColumnChooser {...columns} columns={offered} />}
      />
      <FilterBar filters={filters} define={DEFINE} />
      <DataList
        label="Batches"
        list={list}
        columns={columns}
        filters={filters}
        rowTo={(row) => paths.batch.to(row.id)}
        empty={
          filters.count > 0 ? (
            <EmptyState title="No batch is in this state">Clear the filter to see the others.</EmptyState>
          ) : (
            <EmptyState
              title="No batches yet"
              action={<ButtonLink to={paths.workOrders.to()}>Go to the work orders</ButtonLink>}
            >
              {own ? 'Begin one from its work order.' : 'They appear when a contractor begins one.'}
            </EmptyState>
          )
        }
      />
      <StatusBar
        left={list.total === null ? '' : `${list.rows.length} of ${list.total}`}
        keys={[
          { keys: ['J', 'K'], does: 'row' },
          { keys: ['Enter'], does: 'open' },
          { keys: ['F'], does: 'filters' },
        ]}
      />
    </>
  );
}

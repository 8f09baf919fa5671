import { useMemo } from 'react';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { useReviewQueue } from '#src/features/review/api/review-queue.ts';
import { QUEUE_COLUMNS } from '#src/features/review/components/queue-columns.tsx';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { counted } from '#src/lib/formats.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Batch } from '#shared/generated/api-types.ts';

const FILTERS: readonly FilterDefinition[] = [
  {
    name: 'status',
    label: 'State',
    any: 'waiting or in review',
    options: [
      { value: 'submitted', label: 'waiting' },
      { value: 'in-review', label: 'in review' },
    ],
  },
];
const NAMES = FILTERS.map((filter) => filter.name);
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['F'], does: 'filter' },
];

export function Component() {
  const filters = useFilters(NAMES);
  const status = filters.values['status'];
  const list = useReviewQueue(status === 'submitted' || status === 'in-review' ? status : undefined);
  const mayTake = useCan('review', 'Batch');
  const shown = useMemo(() => QUEUE_COLUMNS.filter(({ id }) => id !== 'take' || mayTake), [mayTake]);
  const columns = useColumns<Batch>({
    columns: shown,
    rows: list.rows,
    rowKey: (batch) => batch.id,
    storageKey: 'review-queue',
  });
  return (
    <>
      <DocumentTitle>Review desk</DocumentTitle>
      <PageBand
        title="Review desk"
        facts={list.total === null ? null : <Fact>{counted(list.total, 'batch', 'batches')}</Fact>}
        actions={<ColumnChooser columns={shown} {...columns} />}
      />
      <FilterBar filters={filters} define={FILTERS} />
      <DataList<Batch>
        label="Batches to review"
        list={list}
        columns={columns}
        rowTo={(batch) => paths.reviewBatch.to(batch.id)}
        filters={filters}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No batch is in that state"
              action={<Button onClick={filters.clear}>Show all that wait</Button>}
            />
          ) : (
            <EmptyState title="Nothing waits for review">
              A batch appears here when a contractor submits it. Inspectors are told by e-mail.
            </EmptyState>
          )
        }
      />
      <StatusBar keys={KEYS} />
    </>
  );
}

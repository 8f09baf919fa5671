import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { standardInForceQuery } from '../api/standard-in-force.ts';
import { structuresQuery } from '../api/structures.ts';
import { KIND_WORDS, PLAN_WORDS, STRUCTURE_COLUMNS } from './structure-columns.tsx';
import { arrange, occurring } from '../lib/sort-structures.ts';
import { withDue, type DesignRow } from '../lib/with-due.ts';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { plannerAddress } from '#src/features/planner/lib/planner-address.ts';
import { usePlansKits } from '#src/features/planner/lib/use-plans-kits.ts';
import type { KeysetList } from '#src/lib/api/use-keyset-list.ts';
import type { Filters } from '#src/lib/filters/use-filters.ts';

const NONE: readonly DesignRow[] = [];
const IDLE = { isStale: false, hasMore: false, isLoadingMore: false, loadMore: () => undefined };

/** The design list: what is planned, and how far each structure is. */
export function StructureList({ orderId, filters }: { orderId: string; filters: Filters }) {
  const structures = useQuery(structuresQuery(orderId));
  const plansKits = usePlansKits();
  const [today] = useState(() => new Date().toLocaleDateString('en-CA'));
  const standard = useQuery(standardInForceQuery(today));
  const all = useMemo(
    () => (structures.data ? withDue(structures.data, standard.data ?? null) : NONE),
    [structures.data, standard.data],
  );
  const { values, sort } = filters;
  const rows = useMemo(() => arrange(all, { values, sort }), [all, values, sort]);
  const define = useMemo(() => definitions(all), [all]);
  const columns = useColumns<DesignRow>({
    columns: STRUCTURE_COLUMNS,
    rows,
    rowKey: (row) => row.id,
    storageKey: 'structures',
  });
  const list: KeysetList<DesignRow> = {
    ...IDLE,
    rows,
    total: rows.length,
    isPending: structures.isPending,
    error: structures.error,
    refetch: () => void structures.refetch(),
  };
  return (
    <>
      <SectionHead
        title="Design list"
        aside={
          <span className="flex items-center gap-4">
            {rows.length === all.length
              ? `${all.length} structures`
              : `${rows.length} of ${all.length} structures`}
            <ColumnChooser {...columns} columns={STRUCTURE_COLUMNS} />
          </span>
        }
      />
      <FilterBar filters={filters} define={define} />
      <DataList
        label="Planned structures"
        list={list}
        columns={columns}
        filters={filters}
        rowTo={plansKits ? (row) => plannerAddress({ order: orderId, structure: row.id }) : undefined}
        empty={
          <EmptyState
            title={all.length > 0 ? 'No structure passes these filters' : 'The design list is empty'}
          >
            {all.length > 0 ? 'Clear a filter to see the others.' : 'The owner adds structures to it.'}
          </EmptyState>
        }
      />
    </>
  );
}

function definitions(rows: readonly DesignRow[]): FilterDefinition[] {
  return [
    {
      name: 'state',
      label: 'State',
      any: 'all',
      options: Object.entries(PLAN_WORDS).map(([value, { word }]) => ({ value, label: word })),
    },
    {
      name: 'kind',
      label: 'Kind',
      options: Object.entries(KIND_WORDS).map(([value, label]) => ({ value, label })),
    },
    { name: 'class', label: 'Class', options: occurring(rows, (row) => row.design.poleClass) },
    { name: 'ground', label: 'Ground', options: occurring(rows, (row) => row.design.ground) },
    { name: 'structure', label: 'Structure', any: 'all' },
  ];
}

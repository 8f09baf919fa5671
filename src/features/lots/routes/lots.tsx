import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
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
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { rowsText, totalText } from '#src/lib/formats-list.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Lot } from '#shared/generated/api-types.ts';
import { LOT_COLUMNS } from '../components/lot-columns.tsx';
import { NewLotDialog } from '../components/new-lot-dialog.tsx';

const FILTERS = ['status', 'number'] as const;
const DEFINE: readonly FilterDefinition[] = [
  {
    name: 'status',
    label: 'State',
    any: 'all',
    options: [
      { value: 'in-use', label: 'in use' },
      { value: 'held', label: 'held' },
      { value: 'recalled', label: 'recalled' },
    ],
  },
  { name: 'number', label: 'Lot number' },
];
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['F'], does: 'filters' },
] as const;

export function Component() {
  const navigate = useNavigate();
  const filters = useFilters(FILTERS);
  const mayEnter = useCan('create', 'Lot');
  const [asking, setAsking] = useState(false);
  const list = useKeysetList<Lot>({ key: 'lots', path: '/api/lots', query: filters.values });
  const columns = useColumns({
    columns: LOT_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'lots',
  });
  return (
    <>
      <DocumentTitle>Lots</DocumentTitle>
      <PageBand
        title="Lots"
        facts={
          <Fact>
            <b>{totalText(list)}</b> lots
          </Fact>
        }
        actions={
          <>
            <ColumnChooser columns={LOT_COLUMNS} isVisible={columns.isVisible} toggle={columns.toggle} />
            {mayEnter ? (
              <Button kind="primary" size="small" onClick={() => setAsking(true)}>
                Enter a lot…
              </Button>
            ) : null}
          </>
        }
      />
      <FilterBar filters={filters} define={DEFINE} />
      <DataList
        label="Lots"
        list={list}
        columns={columns}
        rowTo={(row) => paths.lot.to(row.id)}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No lot is as filtered"
              action={<Button onClick={filters.clear}>Clear the filters</Button>}
            >
              A lot number is looked for whole, as printed.
            </EmptyState>
          ) : (
            <EmptyState title="No lot is entered yet">
              An administrator enters each lot with what was received of it; until then the check calls it
              unknown.
            </EmptyState>
          )
        }
      />
      <StatusBar left={rowsText(list)} keys={KEYS} />
      {mayEnter ? (
        <NewLotDialog
          open={asking}
          onOpenChange={setAsking}
          onEntered={(lot) => void navigate(paths.lot.to(lot.id))}
        />
      ) : null}
    </>
  );
}

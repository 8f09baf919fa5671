import { useSearchParams } from 'react-router-dom';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button, ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ExportLink } from '#src/components/ui/export-link.tsx';
import { AddressHint } from '#src/components/ui/address-hint.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { withQuery } from '#src/lib/api/client.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { rowsText, totalText } from '#src/lib/formats-list.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import { PositionPlot } from '../components/position-plot.tsx';
import { REGISTER_COLUMNS } from '../components/register-columns.tsx';
import {
  REGISTER_FILTERS,
  REGISTER_SORTS,
  useRegisterFilterDefinitions,
} from '#src/lib/filters/register-filters.ts';

const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['F'], does: 'filters' },
] as const;

export function Component() {
  const filters = useFilters(REGISTER_FILTERS, REGISTER_SORTS);
  const define = useRegisterFilterDefinitions();
  const [search, setSearch] = useSearchParams();
  const plotted = search.get('plot') === '1';
  const list = useKeysetList<RegisterRow>({
    key: 'register',
    path: '/api/register',
    query: { ...filters.values, sort: filters.sortParam },
  });
  const columns = useColumns({
    columns: REGISTER_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'register',
  });
  const clerk = useCan('enter', 'RegisterEntry');
  const issues = useCan('issue', 'Transmittal');
  const exports = useCan('export', 'RegisterEntry');

  function togglePlot(): void {
    const next = new URLSearchParams(search);
    if (plotted) next.delete('plot');
    else next.set('plot', '1');
    setSearch(next, { preventScrollReset: true, replace: true });
  }

  return (
    <>
      <DocumentTitle>Register</DocumentTitle>
      <PageBand
        title="Register"
        facts={
          <Fact>
            <b>{totalText(list)}</b> {filters.values['versions'] === 'all' ? 'versions' : 'records'}
          </Fact>
        }
        actions={
          <>
            <Button size="small" aria-pressed={plotted} onClick={togglePlot}>
              {plotted ? 'Hide the plot' : 'Plot'}
            </Button>
            <ColumnChooser columns={REGISTER_COLUMNS} isVisible={columns.isVisible} toggle={columns.toggle} />
            {exports ? (
              <ExportLink path="/api/register/export.csv" query={filters.values}>
                Export CSV
              </ExportLink>
            ) : null}
            {issues ? (
              <ButtonLink
                size="small"
                to={withQuery(paths.transmittals.to(), { ...filters.values, issue: 'filter' })}
              >
                Issue…
              </ButtonLink>
            ) : null}
            {clerk ? (
              <ButtonLink kind="primary" size="small" to={paths.registerEnter.to()}>
                Enter approved lines
              </ButtonLink>
            ) : null}
          </>
        }
      />
      <FilterBar filters={filters} define={define} />
      {plotted && list.rows.length > 0 ? <PositionPlot rows={list.rows} total={list.total} /> : null}
      <DataList
        label="Register"
        list={list}
        columns={columns}
        filters={filters}
        rowTo={(row) => paths.registerRecord.to(row.recordNumber)}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No record is as filtered"
              action={<Button onClick={filters.clear}>Clear the filters</Button>}
            >
              Take a filter away, or look among all versions.
            </EmptyState>
          ) : (
            <EmptyState title="Nothing is on record yet">
              A clerk enters the approved lines of a closed review; each then has a record number here.
            </EmptyState>
          )
        }
      />
      <StatusBar left={rowsText(list)} keys={KEYS} right={<AddressHint />} />
    </>
  );
}

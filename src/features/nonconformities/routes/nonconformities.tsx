import { useQuery } from '@tanstack/react-query';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { AddressHint } from '#src/components/ui/address-hint.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { ExportLink } from '#src/components/ui/export-link.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { formatCount, formatDay } from '#src/lib/formats.ts';
import { rowsText } from '#src/lib/formats-list.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Nonconformity, NonconformitySummary } from '#shared/generated/api-types.ts';
import { nonconformitySummaryQuery } from '../api/summary.ts';
import { NONCONFORMITY_COLUMNS } from '../components/nonconformity-columns.tsx';
import {
  NONCONFORMITY_FILTERS,
  useNonconformityFilterDefinitions,
} from '../components/nonconformity-filters.ts';
import { SummaryCharts } from '../components/summary-charts.tsx';

const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['F'], does: 'filters' },
] as const;

/** The auditor's filter over every record: totals, causes, rates, and each finding with who accepted it on what grounds. */
export function Component() {
  const filters = useFilters(NONCONFORMITY_FILTERS);
  const define = useNonconformityFilterDefinitions();
  const summary = useQuery(nonconformitySummaryQuery(filters.values));
  const exports = useCan('export', 'Nonconformity');
  const list = useKeysetList<Nonconformity>({
    key: 'nonconformities',
    path: '/api/nonconformities',
    query: filters.values,
  });
  const columns = useColumns({
    columns: NONCONFORMITY_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'nonconformities',
  });
  return (
    <>
      <DocumentTitle>Nonconformities</DocumentTitle>
      <PageBand
        title="Nonconformities"
        facts={summary.data ? <Totals summary={summary.data} filters={filters.values} /> : null}
        actions={
          <>
            <ColumnChooser
              columns={NONCONFORMITY_COLUMNS}
              isVisible={columns.isVisible}
              toggle={columns.toggle}
            />
            {exports ? (
              <ExportLink path="/api/nonconformities/export.csv" query={filters.values}>
                Export CSV
              </ExportLink>
            ) : null}
          </>
        }
      />
      <FilterBar filters={filters} define={define} />
      {summary.isError && !list.error ? (
        <ErrorState error={summary.error} what="The summary" onRetry={() => void summary.refetch()} />
      ) : null}
      {summary.data && summary.data.findings > 0 ? <SummaryCharts summary={summary.data} /> : null}
      <DataList
        label="Nonconformities"
        list={list}
        columns={columns}
        filters={filters}
        rowTo={(row) => (row.recordId ? paths.record.to(row.recordId) : paths.batch.to(row.batch.id))}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No finding is as filtered"
              action={<Button onClick={filters.clear}>Clear the filters</Button>}
            >
              Nothing that was submitted does not conform in this way. Take a filter away to see more.
            </EmptyState>
          ) : (
            <EmptyState title="Nothing that was submitted is nonconforming">
              Findings stand here from the day a batch is submitted, whatever is decided about them.
            </EmptyState>
          )
        }
      />
      <StatusBar left={rowsText(list)} keys={KEYS} right={<AddressHint />} />
    </>
  );
}

type TotalsProps = {
  readonly summary: NonconformitySummary;
  readonly filters: Readonly<Record<string, string>>;
};

function Totals({ summary, filters }: TotalsProps) {
  const { from, to } = filters;
  return (
    <>
      <Fact>
        <b>{formatCount(summary.findings)}</b> {summary.findings === 1 ? 'finding' : 'findings'} on{' '}
        <b>{formatCount(summary.records)}</b> {summary.records === 1 ? 'record' : 'records'} of{' '}
        <b>{formatCount(summary.recordsChecked)}</b>
      </Fact>
      {from || to ? (
        <Fact word="installed">
          {from ? formatDay(from) : 'ever'} to {to ? formatDay(to) : 'today'}
        </Fact>
      ) : null}
    </>
  );
}

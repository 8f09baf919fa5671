import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import type { DataColumn } from '#src/components/table/columns.ts';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { CONCESSION_STATES, useConcessions } from '#src/features/concessions/api/concessions.ts';
import {
  CONCESSION_WORDS,
  structuresOf,
  titlesOf,
} from '#src/features/concessions/components/concession-words.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { counted } from '#src/lib/formats.ts';
import type { Concession } from '#shared/generated/api-types.ts';

/** Those that wait come first: without a choice the list shows them alone. */
const FILTERS: readonly FilterDefinition[] = [
  {
    name: 'state',
    label: 'State',
    any: 'asked',
    options: [
      ...CONCESSION_STATES.slice(1).map((value) => ({ value, label: value })),
      { value: 'all', label: 'all' },
    ],
  },
];
const NAMES = FILTERS.map((filter) => filter.name);
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['F'], does: 'filter' },
];

const COLUMNS: readonly DataColumn<Concession>[] = [
  { id: 'number', title: 'Concession', main: true, min: 6, grow: 0, cell: (row) => row.number },
  {
    id: 'state',
    title: 'State',
    min: 7,
    grow: 0,
    cell: (row) => <StateWord {...CONCESSION_WORDS[row.state]} />,
  },
  { id: 'structures', title: 'Structures', min: 8, cell: structuresOf },
  { id: 'findings', title: 'Findings', min: 10, grow: 2, cell: titlesOf },
  { id: 'contractor', title: 'Contractor', min: 11, grow: 2, cell: (row) => row.contractor.name },
  { id: 'batch', title: 'Batch', min: 5, grow: 0, cell: (row) => row.batch.number },
  { id: 'by', title: 'Asked by', min: 7, cell: (row) => row.askedBy },
  { id: 'at', title: 'Asked', min: 9.5, grow: 0, cell: (row) => <Moment at={row.askedAt} /> },
  {
    id: 'answered',
    title: 'Answered by',
    off: true,
    min: 7,
    cell: (row) => row.answeredBy ?? '',
  },
  {
    id: 'ends',
    title: 'Ends',
    off: true,
    min: 7,
    grow: 0,
    cell: (row) => (row.endsOn ? <Day on={row.endsOn} /> : ''),
  },
];

export function Component() {
  const filters = useFilters(NAMES);
  const state = filters.values['state'] ?? 'asked';
  const list = useConcessions(state === 'all' ? undefined : state);
  const columns = useColumns<Concession>({
    columns: COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'concessions',
  });
  // Not counted by the server; known once the last page is here.
  const total = list.total ?? (list.hasMore || list.isPending ? null : list.rows.length);
  return (
    <>
      <DocumentTitle>Concessions</DocumentTitle>
      <PageBand
        title="Concessions"
        facts={total === null ? null : <Fact>{counted(total, 'concession')}</Fact>}
        actions={<ColumnChooser columns={COLUMNS} {...columns} />}
      />
      <FilterBar filters={filters} define={FILTERS} />
      <DataList<Concession>
        label="Concessions"
        list={list}
        columns={columns}
        rowTo={(row) => paths.concession.to(row.id)}
        filters={filters}
        empty={
          state === 'asked' ? (
            <EmptyState
              title="No concession waits for an answer"
              action={<Button onClick={() => filters.set('state', 'all')}>Show those answered</Button>}
            >
              One appears here when an inspector asks for a finding to be accepted as built. The engineers are
              told by e-mail.
            </EmptyState>
          ) : (
            <EmptyState
              title="No concession is in that state"
              action={<Button onClick={filters.clear}>Show those that wait</Button>}
            />
          )
        }
      />
      <StatusBar keys={KEYS} />
    </>
  );
}

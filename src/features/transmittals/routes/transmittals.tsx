import { useMemo, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { REGISTER_FILTERS } from '#src/lib/filters/register-filters.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { readFilters } from '#src/lib/filters/filter-params.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { counted } from '#src/lib/formats.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Transmittal } from '#shared/generated/api-types.ts';
import { IssueDialog } from '../components/issue-dialog.tsx';
import { TRANSMITTAL_COLUMNS } from '../components/transmittal-columns.tsx';

const FILTERS = ['state'] as const;
const DEFINE: readonly FilterDefinition[] = [
  {
    name: 'state',
    label: 'State',
    any: 'all',
    options: [
      { value: 'issued', label: 'issued' },
      { value: 'running', label: 'being written' },
      { value: 'queued', label: 'waits to be written' },
      { value: 'failed', label: 'failed' },
    ],
  },
];
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'open' },
] as const;

export function Component() {
  const navigate = useNavigate();
  const filters = useFilters(FILTERS);
  const [search] = useSearchParams();
  const fromRegister = search.get('issue') === 'filter';
  const scope = useMemo(
    () => (fromRegister ? readFilters(search, REGISTER_FILTERS) : null),
    [fromRegister, search],
  );
  const mayIssue = useCan('issue', 'Transmittal');
  const [asking, setAsking] = useState(fromRegister);
  const list = useKeysetList<Transmittal>({
    key: 'transmittals',
    path: '/api/transmittals',
    query: filters.values,
  });
  const columns = useColumns({
    columns: TRANSMITTAL_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'transmittals',
  });
  const issueButton = (
    <Button kind="primary" size="small" onClick={() => setAsking(true)}>
      Issue…
    </Button>
  );
  return (
    <>
      <DocumentTitle>Transmittals</DocumentTitle>
      <PageBand
        title="Transmittals"
        actions={
          <>
            <ColumnChooser
              columns={TRANSMITTAL_COLUMNS}
              isVisible={columns.isVisible}
              toggle={columns.toggle}
            />
            {mayIssue ? issueButton : null}
          </>
        }
      />
      <FilterBar filters={filters} define={DEFINE} />
      <DataList
        label="Transmittals"
        list={list}
        columns={columns}
        rowTo={(row) => paths.transmittal.to(row.id)}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No transmittal is in this state"
              action={<Button onClick={filters.clear}>Show all</Button>}
            />
          ) : (
            <EmptyState title="Nothing has been issued yet">
              A clerk issues what is on record as an as-built workbook; it stays here as it was issued.
            </EmptyState>
          )
        }
      />
      <StatusBar
        left={
          list.isPending
            ? 'Loading'
            : `${counted(list.rows.length, 'transmittal')}${list.hasMore ? ' and more' : ''}, newest first`
        }
        keys={KEYS}
      />
      {mayIssue ? (
        <IssueDialog
          open={asking}
          onOpenChange={setAsking}
          filter={scope}
          onIssued={(made) => void navigate(paths.transmittal.to(made.id))}
        />
      ) : null}
    </>
  );
}

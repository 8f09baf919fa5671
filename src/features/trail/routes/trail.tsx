import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar, type FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { AddressHint } from '#src/components/ui/address-hint.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { rowsText, totalText } from '#src/lib/formats-list.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { TrailEntry } from '#shared/generated/api-types.ts';
import { actionTitle, TRAIL_ACTIONS } from '#shared/trail/action-title.ts';
import { peopleChoicesQuery } from '../api/people-choices.ts';
import { useVerifyTrail } from '../api/verify-trail.ts';
import { EntryDialog } from '../components/entry-dialog.tsx';
import { SUBJECT_OPTIONS } from '../components/subject-link.ts';
import { OpenEntry, TRAIL_COLUMNS } from '../components/trail-columns.tsx';
import { Verification } from '../components/verification.tsx';

const FILTERS = ['action', 'subject', 'actor', 'from', 'to', 'q'] as const;
const ACTIONS = TRAIL_ACTIONS.map((action) => ({ value: action, label: actionTitle(action) }));
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'details' },
  { keys: ['F'], does: 'filters' },
] as const;

/** Who did what when. */
export function Component() {
  const filters = useFilters(FILTERS);
  const define = useDefinitions(filters.values['subject']);
  const verifies = useCan('verify', 'Trail');
  const verify = useVerifyTrail();
  const [entry, setEntry] = useState<TrailEntry | null>(null);
  const list = useKeysetList<TrailEntry>({ key: 'trail', path: '/api/trail', query: filters.values });
  const columns = useColumns({
    columns: TRAIL_COLUMNS,
    rows: list.rows,
    rowKey: (row) => String(row.seq),
    storageKey: 'trail',
  });
  return (
    <OpenEntry value={setEntry}>
      <DocumentTitle>Trail</DocumentTitle>
      <PageBand
        title="Trail"
        facts={
          <Fact>
            <b>{totalText(list)}</b> steps
          </Fact>
        }
        actions={
          <>
            <ColumnChooser columns={TRAIL_COLUMNS} isVisible={columns.isVisible} toggle={columns.toggle} />
            {verifies ? (
              <Button
                kind="primary"
                size="small"
                busy={verify.isPending && 'Verifying…'}
                onClick={() => verify.mutate()}
              >
                Verify the chain
              </Button>
            ) : null}
          </>
        }
      />
      <FilterBar filters={filters} define={define} />
      <Verification verdict={verify.data} error={verify.error} />
      <DataList
        label="Trail"
        list={list}
        columns={columns}
        rowKeys={{ enter: setEntry }}
        empty={
          <EmptyState
            title="No step is as filtered"
            action={<Button onClick={filters.clear}>Clear the filters</Button>}
          >
            Every step since the beginning stands in the trail; take a filter away to see more.
          </EmptyState>
        }
      />
      <StatusBar left={rowsText(list)} keys={KEYS} right={<AddressHint />} />
      {entry ? <EntryDialog entry={entry} onClose={() => setEntry(null)} /> : null}
    </OpenEntry>
  );
}

function useDefinitions(subject: string | undefined): readonly FilterDefinition[] {
  const readsPeople = useCan('read', 'Person');
  const people = useQuery({ ...peopleChoicesQuery, enabled: readsPeople });
  // A link from another page may ask for the steps of one thing: `batch:<id>`.
  const one = subject?.includes(':') ? [{ value: subject, label: `one ${subject.split(':')[0]}` }] : [];
  return [
    { name: 'action', label: 'Step', options: ACTIONS },
    { name: 'subject', label: 'Of', options: [...one, ...SUBJECT_OPTIONS] },
    ...(readsPeople
      ? [
          {
            name: 'actor',
            label: 'By',
            any: 'anybody',
            options: (people.data ?? []).map(({ id, name }) => ({ value: id, label: name })),
          },
        ]
      : []),
    { name: 'from', label: 'From', type: 'date' },
    { name: 'to', label: 'to', type: 'date' },
    { name: 'q', label: 'Name or number begins' },
  ];
}

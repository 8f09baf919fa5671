import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { organisationsQuery } from '#src/lib/api/reference-lists.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { rowsText, totalText } from '#src/lib/formats-list.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Person } from '#shared/generated/api-types.ts';
import { InviteDialog } from '../components/invite-dialog.tsx';
import { OrganisationList } from '../components/organisation-list.tsx';
import { OpenPerson, PEOPLE_COLUMNS } from '../components/people-columns.tsx';
import { PersonDialog } from '../components/person-dialog.tsx';
import { ROLE_OPTIONS } from '../components/role-options.ts';

const FILTERS = ['q', 'role', 'organisation', 'active'] as const;
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['Enter'], does: 'change' },
  { keys: ['F'], does: 'filters' },
] as const;
const ACCOUNTS = [
  { value: 'true', label: 'open' },
  { value: 'false', label: 'closed' },
] as const;

/** Who may sign in, and the organisations they belong to. */
export function Component() {
  const filters = useFilters(FILTERS);
  const mayInvite = useCan('create', 'Person');
  const organisations = useQuery(organisationsQuery).data ?? [];
  const [inviting, setInviting] = useState(false);
  const [invited, setInvited] = useState<Person | null>(null);
  const [open, setOpen] = useState<Person | null>(null);
  const list = useKeysetList<Person>({ key: 'people', path: '/api/people', query: filters.values });
  const columns = useColumns({
    columns: PEOPLE_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'people',
  });
  return (
    <OpenPerson value={mayInvite ? setOpen : null}>
      <DocumentTitle>People</DocumentTitle>
      <PageBand
        title="People"
        facts={
          <Fact>
            <b>{totalText(list)}</b> people
          </Fact>
        }
        actions={
          mayInvite ? (
            <Button kind="primary" size="small" onClick={() => setInviting(true)}>
              Invite a person…
            </Button>
          ) : null
        }
      />
      <FilterBar
        filters={filters}
        define={[
          { name: 'q', label: 'Name or e-mail has' },
          { name: 'role', label: 'Role', options: ROLE_OPTIONS },
          {
            name: 'organisation',
            label: 'Organisation',
            any: 'all',
            options: organisations.map((one) => ({ value: one.id, label: one.name })),
          },
          { name: 'active', label: 'Account', any: 'all', options: ACCOUNTS },
        ]}
      />
      {invited ? (
        <p role="status" className="px-gutter py-2 text-conform">
          {invited.name} is invited; the link went to {invited.email}.
        </p>
      ) : null}
      <DataList
        label="People"
        list={list}
        columns={columns}
        rowKeys={mayInvite ? { enter: setOpen } : undefined}
        empty={
          <EmptyState
            title="Nobody is as filtered"
            action={<Button onClick={filters.clear}>Clear the filters</Button>}
          >
            Part of a name or address is enough.
          </EmptyState>
        }
      />
      <OrganisationList organisations={organisations} />
      <StatusBar left={rowsText(list)} keys={KEYS} />
      {mayInvite ? (
        <InviteDialog
          organisations={organisations}
          open={inviting}
          onOpenChange={setInviting}
          onInvited={(person) => {
            setInvited(person);
            setInviting(false);
          }}
        />
      ) : null}
      {open ? <PersonDialog key={open.id} person={open} onClose={() => setOpen(null)} /> : null}
    </OpenPerson>
  );
}

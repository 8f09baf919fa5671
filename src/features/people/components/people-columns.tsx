import { createContext, useContext } from 'react';
import type { DataColumn } from '#src/components/table/columns.ts';
import { Address } from '#src/components/ui/address.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import type { Person } from '#shared/generated/api-types.ts';

/** Opens a person; null where one may only read. */
export const OpenPerson = createContext<((person: Person) => void) | null>(null);

function Name({ row }: { row: Person }) {
  const open = useContext(OpenPerson);
  if (!open) return <>{row.name}</>;
  return (
    <button
      type="button"
      onClick={() => open(row)}
      className="max-w-full truncate text-left font-semibold hover:underline pointer-coarse:py-2"
    >
      {row.name}
    </button>
  );
}

function Account({ row }: { row: Person }) {
  if (!row.active) return <StateWord glyph="cross" word="closed" />;
  return row.invited ? <StateWord glyph="dotted" word="invited" /> : <StateWord glyph="tick" word="open" />;
}

export const PEOPLE_COLUMNS: readonly DataColumn<Person>[] = [
  { id: 'name', title: 'Name', min: 8, grow: 1.2, main: true, cell: (row) => <Name row={row} /> },
  { id: 'email', title: 'E-mail', min: 14, grow: 2, cell: (row) => <Address>{row.email}</Address> },
  { id: 'role', title: 'Role', min: 7, cell: (row) => row.role },
  { id: 'organisation', title: 'Organisation', min: 11, grow: 1.6, cell: (row) => row.organisation.name },
  { id: 'account', title: 'Account', min: 6, cell: (row) => <Account row={row} /> },
  {
    id: 'last',
    title: 'Last signed in',
    min: 10,
    cell: (row) =>
      row.lastSignInAt ? <Moment at={row.lastSignInAt} /> : <span className="text-muted">never</span>,
  },
];

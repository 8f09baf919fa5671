import { createContext, useContext } from 'react';
import type { DataColumn } from '#src/components/table/columns.ts';
import { Moment } from '#src/components/ui/moment.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import type { TrailEntry } from '#shared/generated/api-types.ts';
import { plainLines } from './payload-lines.ts';
import { subjectLink } from './subject-link.ts';

/** Opens an entry; the columns are constants and reach it from here. */
export const OpenEntry = createContext<(entry: TrailEntry) => void>(() => undefined);

function Title({ row }: { row: TrailEntry }) {
  const open = useContext(OpenEntry);
  return (
    <button
      type="button"
      onClick={() => open(row)}
      className="max-w-full truncate text-left font-semibold hover:underline pointer-coarse:py-2"
    >
      {row.title}
    </button>
  );
}

function Subject({ row }: { row: TrailEntry }) {
  const to = subjectLink(row.subject);
  const label = row.subject.label ?? row.subject.type;
  return to ? <TextLink to={to}>{label}</TextLink> : <>{label}</>;
}

export const TRAIL_COLUMNS: readonly DataColumn<TrailEntry>[] = [
  { id: 'title', title: 'Step', min: 14, grow: 1.4, main: true, cell: (row) => <Title row={row} /> },
  { id: 'subject', title: 'Of', min: 9, grow: 1.2, cell: (row) => <Subject row={row} /> },
  { id: 'by', title: 'By', min: 8, cell: (row) => row.actor ?? 'Upstand itself' },
  { id: 'role', title: 'Role', min: 6.5, cell: (row) => row.role ?? '–' },
  { id: 'at', title: 'When', min: 10, cell: (row) => <Moment at={row.at} /> },
  {
    id: 'payload',
    title: 'Written down',
    min: 14,
    grow: 3,
    cell: (row) => (
      <span className="text-ink-2">
        {plainLines(row.payload)
          .map((line) => `${line.name} ${line.text}`)
          .join('; ') || '–'}
      </span>
    ),
  },
  { id: 'seq', title: 'No.', figures: true, min: 4, grow: 0.4, cell: (row) => row.seq },
  {
    id: 'hash',
    title: 'Hash',
    min: 8,
    off: true,
    cell: (row) => <span title={row.hash}>{row.hash.slice(0, 12)}…</span>,
  },
];

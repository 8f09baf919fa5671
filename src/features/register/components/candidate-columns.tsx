import { createContext, useContext } from 'react';
import type { DataColumn } from '#src/components/table/columns.ts';
import { Day } from '#src/components/ui/moment.tsx';
import { StateWord } from '#src/components/ui/state-word.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { kindWord } from '#src/lib/filters/rule-options.ts';
import type { RegisterCandidate } from '#shared/generated/api-types.ts';
import type { Selection } from './selection.ts';

type Chosen = {
  readonly selection: Selection;
  readonly toggle: (id: string, options?: { through: boolean }) => void;
};

/** The columns are constants; what is ticked reaches their cells from here. */
export const ChosenCandidates = createContext<Chosen>({ selection: new Set(), toggle: () => undefined });

function Tick({ row }: { row: RegisterCandidate }) {
  const { selection, toggle } = useContext(ChosenCandidates);
  return (
    <label className="inline-flex items-center gap-2.5 align-middle pointer-coarse:min-h-11">
      <input
        type="checkbox"
        className="size-4 accent-ink"
        checked={selection.has(row.recordId)}
        onChange={(event) => toggle(row.recordId, { through: (event.nativeEvent as MouseEvent).shiftKey })}
      />
      {row.structureNumber}
    </label>
  );
}

export const CANDIDATE_COLUMNS: readonly DataColumn<RegisterCandidate>[] = [
  { id: 'structure', title: 'Structure', min: 8, main: true, cell: (row) => <Tick row={row} /> },
  {
    id: 'sheet',
    title: 'Record sheet',
    min: 6,
    cell: (row) => (
      <TextLink to={paths.record.to(row.recordId)} aria-label={`Record sheet of ${row.structureNumber}`}>
        open
      </TextLink>
    ),
  },
  { id: 'kind', title: 'Kind', min: 5, cell: (row) => kindWord(row.kind) },
  {
    id: 'state',
    title: 'State',
    min: 9,
    cell: (row) =>
      row.nonconforming ? (
        <StateWord glyph="lozenge" word="by concession" />
      ) : (
        <StateWord glyph="tick" word="approved" />
      ),
  },
  {
    id: 'supersedes',
    title: 'Supersedes',
    min: 7,
    cell: (row) =>
      row.supersedes ? (
        <TextLink to={paths.registerRecord.to(row.supersedes)}>{row.supersedes}</TextLink>
      ) : (
        <span className="text-muted">nothing</span>
      ),
  },
  { id: 'batch', title: 'Batch', min: 5, cell: (row) => row.batch.number },
  { id: 'order', title: 'Work order', min: 5, cell: (row) => row.workOrder.number },
  { id: 'contractor', title: 'Contractor', min: 9, grow: 1.5, cell: (row) => row.contractor.name },
  {
    id: 'installed',
    title: 'Installed',
    figures: true,
    min: 6.5,
    cell: (row) => (row.installedOn ? <Day on={row.installedOn} /> : 'not known'),
  },
];

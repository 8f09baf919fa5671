import type { DataColumn } from '#src/components/table/columns.ts';
import { Figure } from '#src/components/ui/figure.tsx';
import { Day, Moment } from '#src/components/ui/moment.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { kindWord } from '#src/lib/filters/rule-options.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import { Pole } from './pole.tsx';
import { Conformity } from './conformity.tsx';

export const REGISTER_COLUMNS: readonly DataColumn<RegisterRow>[] = [
  {
    id: 'structure',
    title: 'Structure',
    sort: 'structure',
    min: 4.8,
    grow: 0.3,
    main: true,
    cell: (row) => row.structureNumber,
  },
  { id: 'record', title: 'Record', min: 5.4, grow: 0.3, cell: recordAndVersion },
  {
    id: 'version',
    title: 'Version',
    min: 4,
    grow: 0,
    figures: true,
    off: true,
    cell: (row) => (row.current ? row.version : `${row.version}, old`),
  },
  { id: 'kind', title: 'Kind', min: 4.4, grow: 0.3, cell: (row) => kindWord(row.kind) },
  { id: 'pole', title: 'Pole', min: 7, grow: 4, cell: (row) => <Pole pole={row.pole} /> },
  {
    id: 'embedment',
    title: 'Embedment',
    unit: 'ft',
    figures: true,
    min: 6.6,
    grow: 0.2,
    cell: (row) => <Figure value={row.embedmentFt} unit="ft" />,
  },
  {
    id: 'due',
    title: 'Due',
    unit: 'ft',
    figures: true,
    min: 3.5,
    grow: 0.2,
    cell: (row) => <Figure value={row.dueFt} unit="ft" />,
  },
  {
    id: 'fill',
    title: 'Fill ratio',
    figures: true,
    min: 5.5,
    grow: 0.2,
    cell: (row) =>
      row.fillRatio === null ? (
        <Figure value={null} unit="ratio" />
      ) : (
        <Quantity value={row.fillRatio} unit="ratio" plusMinus={row.fillRatioU} />
      ),
  },
  { id: 'state', title: 'State', min: 9.2, grow: 0.3, cell: (row) => <Conformity row={row} /> },
  { id: 'lots', title: 'Lot', min: 5, grow: 0.3, cell: (row) => row.lots.join(', ') || '–' },
  { id: 'contractor', title: 'Contractor', min: 6.5, grow: 3.2, cell: (row) => row.contractor.name },
  { id: 'order', title: 'Work order', min: 5, off: true, cell: (row) => row.workOrder.number },
  {
    id: 'installed',
    title: 'Installed',
    sort: 'installed',
    figures: true,
    min: 6.2,
    grow: 0.2,
    cell: (row) => (row.installedOn ? <Day on={row.installedOn} /> : '–'),
  },
  {
    id: 'entered',
    title: 'Entered',
    sort: 'entered',
    min: 9.5,
    off: true,
    cell: (row) => <Moment at={row.enteredAt} />,
  },
  { id: 'by', title: 'Entered by', min: 6.5, off: true, cell: (row) => row.enteredBy },
];

/** The version is said where it is not the first and only one. */
function recordAndVersion({ recordNumber, version, current }: RegisterRow): string {
  if (!current) return `${recordNumber}, version ${version}, superseded`;
  return version > 1 ? `${recordNumber}, version ${version}` : recordNumber;
}

import type { DataColumn } from '#src/components/table/columns.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import type { GlyphName } from '#src/components/ui/glyph.tsx';
import type { DesignRow } from '../lib/with-due.ts';
import { StructureFigure } from './structure-figure.tsx';
import { formatNumber } from '#shared/units/format-quantity.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';

export const KIND_WORDS = { set: 'set', straighten: 'straighten', relevel: 're-level' } as const;

export const PLAN_WORDS: Readonly<Record<PlannedStructure['state'], { glyph: GlyphName; word: string }>> = {
  planned: { glyph: 'dotted', word: 'planned' },
  'in-batch': { glyph: 'info', word: 'in batch' },
  approved: { glyph: 'tick', word: 'approved' },
  'on-record': { glyph: 'tick', word: 'on record' },
};

const words = (text: string | null) =>
  text === null ? <span className="text-muted">–</span> : text.replaceAll('-', ' ');

function PlanState({ row }: { row: PlannedStructure }) {
  const { glyph, word } = PLAN_WORDS[row.state];
  const to = row.recordNumber
    ? paths.registerRecord.to(row.recordNumber)
    : row.batchId
      ? paths.batch.to(row.batchId)
      : null;
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
      <Glyph name={glyph} />
      {to ? <TextLink to={to}>{word}</TextLink> : word}
    </span>
  );
}

/** About a yard. */
const DEGREES = { digits: 5, fixed: true };

function Position({ row }: { row: PlannedStructure }) {
  const { latitude, longitude } = row.design;
  if (latitude === null || longitude === null) return words(null);
  return (
    <span className="whitespace-nowrap">
      {formatNumber(latitude, DEGREES)}, {formatNumber(longitude, DEGREES)}
    </span>
  );
}

export const STRUCTURE_COLUMNS: readonly DataColumn<DesignRow>[] = [
  {
    id: 'structure',
    title: 'Structure',
    main: true,
    min: 6,
    sort: 'structure',
    cell: (row) => row.structureNumber,
  },
  { id: 'kind', title: 'Kind', min: 5.5, sort: 'kind', cell: (row) => KIND_WORDS[row.kind] },
  {
    id: 'length',
    title: 'Length',
    unit: 'ft',
    figures: true,
    min: 5,
    grow: 0.5,
    sort: 'length',
    cell: (row) => <StructureFigure value={row.design.poleLengthFt} digits={0} />,
  },
  {
    id: 'class',
    title: 'Class',
    figures: true,
    min: 4,
    grow: 0.5,
    sort: 'class',
    cell: (row) => words(row.design.poleClass),
  },
  {
    id: 'material',
    title: 'Material',
    min: 9,
    sort: 'material',
    cell: (row) => words(row.design.poleMaterial),
  },
  { id: 'ground', title: 'Ground', min: 7, sort: 'ground', cell: (row) => words(row.design.ground) },
  {
    id: 'due',
    title: 'Embedment due',
    unit: 'ft',
    figures: true,
    min: 10.5,
    grow: 0.5,
    sort: 'due',
    cell: (row) => <StructureFigure value={row.dueFt} digits={2} />,
  },
  { id: 'position', title: 'Position, °', figures: true, min: 11, cell: (row) => <Position row={row} /> },
  { id: 'state', title: 'State', min: 7, sort: 'state', cell: (row) => <PlanState row={row} /> },
];

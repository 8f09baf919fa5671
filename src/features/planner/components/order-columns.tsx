import type { DataColumn } from '#src/components/table/columns.ts';
import { Figure } from '#src/components/ui/figure.tsx';
import { kitsText } from '#shared/planner/kits-text.ts';
import type { OrderRow } from '#shared/planner/plan-order.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';

export type PlannedRow = OrderRow<PlannedStructure>;

const KIND_WORDS = { set: 'set', straighten: 'straighten', relevel: 're-level' } as const;

function pole({ design }: PlannedStructure): string {
  const length = design.poleLengthFt === null ? '' : `${design.poleLengthFt} ft`;
  const poleClass = design.poleClass === null ? '' : `cl ${design.poleClass}`;
  return (
    [length, poleClass, design.poleMaterial?.replaceAll('-', ' ') ?? ''].filter(Boolean).join(' ') || '–'
  );
}

export const PLANNED_COLUMNS: readonly DataColumn<PlannedRow>[] = [
  {
    id: 'structure',
    title: 'Structure',
    main: true,
    min: 6,
    grow: 0.5,
    cell: (row) => row.structure.structureNumber,
  },
  { id: 'kind', title: 'Kind', min: 5.5, grow: 0.3, cell: (row) => KIND_WORDS[row.structure.kind] },
  { id: 'pole', title: 'Pole', min: 11, grow: 0.5, cell: (row) => pole(row.structure) },
  {
    id: 'depth',
    title: 'Depth',
    unit: 'ft',
    figures: true,
    min: 5,
    grow: 0.2,
    cell: (row) => <Figure value={row.plan.depthFt} unit="ft" />,
  },
  {
    id: 'bore',
    title: 'Bore',
    unit: 'in',
    figures: true,
    min: 4.5,
    grow: 0.2,
    cell: (row) => <Figure value={row.plan.boreIn} unit="in" digits={1} />,
  },
  {
    id: 'void',
    title: 'Void',
    unit: 'ft3',
    figures: true,
    min: 5.5,
    grow: 0.2,
    cell: (row) => <Figure value={row.plan.voidFt3?.likely ?? null} unit="ft3" />,
  },
  {
    id: 'range',
    title: 'Low to high',
    unit: 'ft3',
    figures: true,
    min: 8.5,
    grow: 0.2,
    cell: ({ plan: { voidFt3 } }) =>
      voidFt3 === null ? (
        '–'
      ) : (
        <>
          <Figure value={voidFt3.low} unit="ft3" /> to <Figure value={voidFt3.high} unit="ft3" />
        </>
      ),
  },
  {
    id: 'kits',
    title: 'Kits, ft³',
    min: 10,
    grow: 4,
    cell: ({ plan }) =>
      plan.kits.likely ? (
        <span className="font-semibold">{kitsText(plan.kits.likely.kits)}</span>
      ) : (
        <span className="text-query">{plan.faults[0]?.text ?? 'not known'}</span>
      ),
  },
];

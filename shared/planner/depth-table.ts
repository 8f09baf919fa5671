import { leastAnnulusIn } from '#shared/calc/annulus.ts';
import { setSpace, setVoid } from '#shared/calc/set-space.ts';
import { csvLine, type CsvCell } from '#shared/export/csv.ts';
import { assumptionsOf } from './assumptions.ts';
import { leastGapIn } from './choose-bore.ts';
import { kitsText } from './kits-text.ts';
import type { KitAnswer, PlanContext } from './plan-types.ts';
import { kitAnswer } from './range-kits.ts';
import type { PlanFault, PlanReading } from './read-plan.ts';
import { withBore } from './set-plan-values.ts';

export type TableCell = {
  readonly voidFt3: number | null;
  readonly kits: KitAnswer | null;
  /** `narrow`: less gap than the standard asks for. `none`: the pole does not go in. */
  readonly fit: 'fits' | 'narrow' | 'none';
};

export type DepthTable = {
  readonly boresIn: readonly number[];
  readonly rows: readonly { readonly depthFt: number; readonly cells: readonly TableCell[] }[];
  readonly faults: readonly PlanFault[];
};

/** So many rows and columns stand on one page of Letter. */
export const MOST_ROWS = 16;
export const MOST_COLUMNS = 8;
const FROM_FT = 4;
const TO_FT = 10;
const STEP_FT = 0.5;

function depthsOf({ numbers }: PlanReading): {
  readonly depths: readonly number[];
  readonly faults: readonly PlanFault[];
} {
  const from = numbers.get('fromFt') ?? FROM_FT;
  const to = numbers.get('toFt') ?? Math.max(TO_FT, from);
  const step = numbers.get('stepFt') ?? STEP_FT;
  if (to < from - 1e-9)
    return { depths: [], faults: [{ field: 'toFt', text: 'Less than the depth it begins at.' }] };
  const wanted = Math.floor((to - from) / step + 1e-9) + 1;
  const depths = Array.from({ length: Math.min(wanted, MOST_ROWS) }, (_, at) => from + at * step);
  const faults =
    wanted > MOST_ROWS
      ? [
          {
            field: 'stepFt',
            text: `${wanted} rows do not fit on a page: the first ${MOST_ROWS} are shown. Take a larger step.`,
          },
        ]
      : [];
  return { depths, faults };
}

/** Void and kits of one pole by bore diameter and setting depth, at the same assumptions as its plan. */
export function depthTable(reading: PlanReading, context: PlanContext): DepthTable {
  const { standard } = context;
  const assumptions = assumptionsOf(reading, context);
  const augers = reading.sizes.get('augersIn') ?? [];
  const boresIn = augers.slice(0, MOST_COLUMNS);
  const { depths, faults } = depthsOf(reading);
  const least = leastGapIn(standard);
  const cell = (depthFt: number, boreIn: number): TableCell => {
    const at = { ...reading, numbers: new Map(reading.numbers).set('embedmentFt', depthFt) };
    const { values } = withBore(at, { boreIn, assumptions, standard });
    const gap = leastAnnulusIn(values);
    const space = setSpace(values, standard);
    if (gap === null || space === null) return { voidFt3: null, kits: null, fit: 'fits' };
    if (gap <= 0) return { voidFt3: null, kits: null, fit: 'none' };
    const voidFt3 = setVoid(space);
    return {
      voidFt3,
      kits: kitAnswer(voidFt3, assumptions, context),
      fit: gap < least - 1e-9 ? 'narrow' : 'fits',
    };
  };
  return {
    boresIn,
    rows: depths.map((depthFt) => ({ depthFt, cells: boresIn.map((boreIn) => cell(depthFt, boreIn)) })),
    faults: [
      ...faults,
      ...(augers.length > MOST_COLUMNS
        ? [{ field: 'augersIn', text: `The table has room for ${MOST_COLUMNS} bores: the first are shown.` }]
        : []),
    ],
  };
}

const FIT_WORDS = { fits: '', narrow: 'gap narrow', none: 'pole does not fit' } as const;

/** The table as CSV, a line for each bore and depth; `head` are lines of what it was made from. */
export function depthTableCsv(table: DepthTable, head: readonly (readonly CsvCell[])[]): string {
  const lines = table.rows.flatMap(({ depthFt, cells }) =>
    cells.map(({ voidFt3, kits, fit }, at): CsvCell[] => [
      table.boresIn[at] ?? null,
      depthFt,
      voidFt3 === null ? null : Math.round(voidFt3 * 1e4) / 1e4,
      kits === null ? null : Math.round(kits.needFt3 * 1e4) / 1e4,
      kits === null ? null : kitsText(kits.kits),
      FIT_WORDS[fit],
    ]),
  );
  const titles = ['Bore (in)', 'Depth (ft)', 'Void (ft³)', 'Need (ft³)', 'Kits (ft³)', 'Note'];
  return [...head, [], titles, ...lines].map(csvLine).join('');
}

import type { FilterValues, Sort } from '#src/lib/filters/filter-params.ts';
import type { DesignRow } from './with-due.ts';

export const STRUCTURE_FILTERS = ['state', 'kind', 'class', 'ground', 'structure'] as const;
export const STRUCTURE_SORTS = [
  'structure',
  'kind',
  'length',
  'class',
  'material',
  'ground',
  'due',
  'state',
] as const;

const STATES = ['planned', 'in-batch', 'approved', 'on-record'] as const;

type Value = string | number | null;
const VALUES: Readonly<Record<string, (row: DesignRow) => Value>> = {
  structure: (row) => row.structureNumber,
  kind: (row) => row.kind,
  length: (row) => row.design.poleLengthFt,
  class: (row) => row.design.poleClass,
  material: (row) => row.design.poleMaterial,
  ground: (row) => row.design.ground,
  due: (row) => row.dueFt,
  state: (row) => STATES.indexOf(row.state),
};

const natural = new Intl.Collator('en-US', { numeric: true, sensitivity: 'base' });

function compare(a: Value, b: Value): number {
  if (typeof a === 'number' && typeof b === 'number') return a - b;
  return natural.compare(String(a), String(b));
}

/** The rows that pass, in the order asked for. What is not known stands last, whichever way it is sorted. */
export function arrange(
  rows: readonly DesignRow[],
  { values, sort }: { readonly values: FilterValues; readonly sort: Sort | null },
): readonly DesignRow[] {
  const wanted = values['structure']?.toLowerCase();
  const passing = rows.filter(
    (row) =>
      (!values['state'] || row.state === values['state']) &&
      (!values['kind'] || row.kind === values['kind']) &&
      (!values['class'] || row.design.poleClass === values['class']) &&
      (!values['ground'] || row.design.ground === values['ground']) &&
      (!wanted || row.structureNumber.toLowerCase().includes(wanted)),
  );
  const value = sort ? VALUES[sort.key] : undefined;
  if (!sort || !value) return passing;
  const way = sort.descending ? -1 : 1;
  return passing.sort((one, other) => {
    const [a, b] = [value(one), value(other)];
    if (a === null || b === null) return Number(a === null) - Number(b === null);
    return way * compare(a, b) || natural.compare(one.structureNumber, other.structureNumber);
  });
}

/** The values that occur, for the choice of a filter. */
export function occurring(
  rows: readonly DesignRow[],
  of: (row: DesignRow) => string | null,
): { value: string; label: string }[] {
  const found = new Set(rows.flatMap((row) => of(row) ?? []));
  return [...found].sort(natural.compare).map((value) => ({ value, label: value }));
}

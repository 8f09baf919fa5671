import { boreProfile } from './bore-profile.ts';
import { numberOf, positiveOf, textOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

type Columns = { readonly soilFt: number; readonly rockFt: number };
type DueDepth = Standard['dueDepth'];

/** Soil and rock columns by length: the table, a length between two taking the longer; beyond it the rule. */
export function dueColumns(rules: DueDepth, lengthFt: number): Columns {
  const rows = [...rules.table].sort((a, b) => a.lengthFt - b.lengthFt);
  const row = rows.find((row) => row.lengthFt >= lengthFt - 1e-9);
  if (row !== undefined) return row;
  const soilFt = Math.max(rules.beyondLeastFt, rules.beyondShare * lengthFt + rules.beyondPlusFt);
  return { soilFt, rockFt: Math.max(0, soilFt - rules.beyondRockLessFt) };
}

/** Depth due for rock from `rockFromFt` under soil, ft. */
function overRock(rules: DueDepth, { soilFt, rockFt }: Columns, rockFromFt: number): number {
  if (rules.overRock === 'by-share') {
    const soilShare = Math.min(Math.max(rockFromFt / soilFt, 0), 1);
    return rockFt + (soilFt - rockFt) * soilShare;
  }
  return rockFromFt <= rules.shallowRockFt + 1e-9 ? Math.min(rockFromFt + rockFt, soilFt) : soilFt;
}

/** The standard's setting depth of a *set* record, ft, from the low side; null where length, ground, or what rock asks for is missing. */
export function standardDepthFt(values: FieldValues, rules: DueDepth): number | null {
  const lengthFt = positiveOf(values, 'poleLengthFt');
  const ground = textOf(values, 'ground');
  if (lengthFt === null) return null;
  const columns = dueColumns(rules, lengthFt);
  if (ground === 'soil') return columns.soilFt;
  if (ground !== 'rock' && ground !== 'soil-over-rock') return null;
  // A bore in rock this wide is filled like one in soil (US Army signal subcourse SS0439A; read).
  const leastBoreIn = boreProfile({ ...values, boreDepthFt: 1 })?.leastIn ?? null;
  if (leastBoreIn === null) return null;
  if (leastBoreIn >= rules.wideBoreIn - 1e-9) return columns.soilFt;
  if (ground === 'rock') return columns.rockFt;
  const rockFromFt = numberOf(values, 'rockFromFt');
  return rockFromFt === null ? null : overRock(rules, columns, rockFromFt);
}

/** Depth due, ft: the larger of the standard's and the design's, where the work order states one. */
export function dueDepthFt({
  values,
  standard,
  designEmbedmentFt = null,
}: {
  readonly values: FieldValues;
  readonly standard: Standard;
  readonly designEmbedmentFt?: number | null;
}): number | null {
  const own = standardDepthFt(values, standard.dueDepth);
  if (own === null) return null;
  return designEmbedmentFt === null ? own : Math.max(own, designEmbedmentFt);
}

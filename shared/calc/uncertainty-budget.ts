import { relevelSpaceRead } from './derive-relevel.ts';
import { setSpaceRead, type ReadInput } from './derive-set.ts';
import { straightenSpaceRead } from './derive-straighten.ts';
import { contributions, type ReadingSource } from './fill-uncertainty.ts';
import { numberOf } from './values.ts';
import type { Kind } from '#shared/records/types.ts';

/** One source of the uncertainty of a fill ratio. */
export type BudgetPart = {
  readonly source: ReadingSource | 'yield';
  /** Readings of it that the record has. */
  readonly fields: readonly string[];
  /** Expanded uncertainty (k = 2) of one such reading: inches, for the yield a share. */
  readonly within: number;
  /** Expanded uncertainty of the fill ratio (k = 2) if this were all. */
  readonly ofRatio: number;
  /** Share of u² (JCGM 100:2008, 5.1.2): the shares add to 1. */
  readonly share: number;
};

const READ = { set: setSpaceRead, straighten: straightenSpaceRead, relevel: relevelSpaceRead };
const K = 2;

/** What the ± of a fill ratio comes from, the greatest part first. Empty where there is no ratio, or no void to speak of. */
export function uncertaintyBudget(
  kind: Kind,
  { fillRatio, ...input }: ReadInput & { readonly fillRatio: number | null },
): readonly BudgetPart[] {
  const { voidFt3, groups } = READ[kind](input);
  if (fillRatio === null || voidFt3 === null || !(voidFt3 > 0)) return [];
  const { placedShare } = input.standard.uncertainty;
  const relative = [
    { source: 'yield' as const, fields: [], u: placedShare, part: placedShare },
    ...contributions(groups).map(({ group, uV }) => ({
      source: group.source,
      fields: group.readings
        .map(({ field }) => field)
        .filter((field) => numberOf(input.values, field) !== null),
      u: group.u,
      part: uV / voidFt3,
    })),
  ];
  const whole = relative.reduce((sum, { part }) => sum + part ** 2, 0);
  if (!(whole > 0)) return [];
  return relative
    .map(({ source, fields, u, part }) => ({
      source,
      fields,
      within: K * u,
      ofRatio: K * fillRatio * part,
      share: part ** 2 / whole,
    }))
    .toSorted((a, b) => b.share - a.share);
}

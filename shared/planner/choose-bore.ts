import { leastAnnulusIn } from '#shared/calc/annulus.ts';
import type { Standard } from '#shared/standard/types.ts';
import type { Assumptions } from './assumptions.ts';
import type { PlanReading } from './read-plan.ts';
import { withBore } from './set-plan-values.ts';

/** Least gap by the owner's standard, inches; where that rule is off, any gap at all. */
export function leastGapIn({ rules }: Standard): number {
  const rule = rules['annulus-narrow'];
  return rule.on ? rule.params.leastGapIn : 0.01;
}

/** Greatest gap by the owner's standard, inches; null where that rule is off. */
export function greatestGapIn({ rules }: Standard): number | null {
  const rule = rules['annulus-wide'];
  return rule.on ? rule.params.greatestGapIn : null;
}

export type BoreChoice = {
  /** Null: no auger, or a pole of unknown size. */
  readonly boreIn: number | null;
  readonly from: 'typed' | 'augers' | 'none-wide-enough' | 'pole-unknown' | 'no-augers';
};

/** The bore as typed, or else the least auger that leaves the standard's gap round the pole; the widest where none does. */
export function chooseBore(
  reading: PlanReading,
  options: { readonly assumptions: Assumptions; readonly standard: Standard },
): BoreChoice {
  const typed = reading.numbers.get('boreIn');
  if (typed !== undefined) return { boreIn: typed, from: 'typed' };
  const augers = reading.sizes.get('augersIn') ?? [];
  const least = leastGapIn(options.standard);
  let known = false;
  for (const boreIn of augers) {
    const gap = leastAnnulusIn(withBore(reading, { ...options, boreIn }).values);
    if (gap === null) continue;
    known = true;
    if (gap >= least - 1e-9) return { boreIn, from: 'augers' };
  }
  const widest = augers.at(-1) ?? null;
  if (widest === null) return { boreIn: null, from: 'no-augers' };
  return known ? { boreIn: widest, from: 'none-wide-enough' } : { boreIn: null, from: 'pole-unknown' };
}

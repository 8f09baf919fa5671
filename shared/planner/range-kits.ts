import { planKits } from '#shared/calc/kit-plan.ts';
import { yieldFactor } from '#shared/calc/waits.ts';
import type { Assumptions } from './assumptions.ts';
import type { KitAnswer, PlanContext, RangeKits, VoidRange } from './plan-types.ts';

const NO_KITS: RangeKits = { low: null, likely: null, high: null };

/** The exact choice of kits for a void in ft³ (`planKits`), with the assumed sizes, allowance and temperature. Null: no product, no size, or a need beyond any set of kits. */
export function kitAnswer(
  voidFt3: number,
  assumptions: Assumptions,
  { standard, product }: PlanContext,
): KitAnswer | null {
  if (product === null || assumptions.kitsFt3.length === 0) return null;
  const { tempF, allowanceShare, kitsFt3 } = assumptions;
  const plan = planKits({
    voidFt3,
    tempF,
    product: { ...product, kitsFt3: [...kitsFt3] as typeof product.kitsFt3 },
    standard: { ...standard, kits: { ...standard.kits, allowanceShare } },
  });
  if (plan === null) return null;
  const nominal = plan.kits.reduce((sum, kit) => sum + kit, 0);
  return { ...plan, placedFt3: nominal * yieldFactor(product, tempF) };
}

export function rangeKits(
  voidFt3: VoidRange | null,
  assumptions: Assumptions,
  context: PlanContext,
): RangeKits {
  if (voidFt3 === null) return NO_KITS;
  const of = (volume: number) => kitAnswer(volume, assumptions, context);
  return { low: of(voidFt3.low), likely: of(voidFt3.likely), high: of(voidFt3.high) };
}

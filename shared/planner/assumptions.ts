import type { Product, Standard } from '#shared/standard/types.ts';
import type { PlanReading } from './read-plan.ts';

/** What the plan takes for granted: each stands on the page and can be changed there. */
export type Assumptions = {
  readonly tempF: number;
  readonly allowanceShare: number;
  readonly spareShare: number;
  readonly kitsFt3: readonly number[];
  readonly taperIn: number;
  readonly overDigFt: number;
  readonly tolBoreIn: number;
  /** A pole by the class table is no thinner than it says; it may be thicker by this. */
  readonly tolPoleTableIn: number;
  readonly tolPoleTapedIn: number;
  readonly tolDepthIn: number;
  readonly tolGapIn: number;
};

/** A day on which the components stand at room temperature: the planner's own assumption. */
export const USUAL_TEMP_F = 70;
/** Tolerances not typed are twice the owner's standard uncertainty: what its own tape can tell (k = 2). */
const K = 2;

/** Typed, or else by the owner's standard and the product; units as the names say. */
export function assumptionsOf(
  reading: PlanReading,
  { standard, product }: { readonly standard: Standard; readonly product: Product | null },
): Assumptions {
  const { numbers, sizes } = reading;
  const or = (key: string, usual: number) => numbers.get(key) ?? usual;
  const { uncertainty, kits } = standard;
  return {
    tempF: or('tempF', USUAL_TEMP_F),
    allowanceShare: or('allowancePct', kits.allowanceShare * 100) / 100,
    spareShare: or('sparePct', kits.spareShare * 100) / 100,
    kitsFt3: sizes.get('kitsFt3') ?? product?.kitsFt3 ?? [],
    taperIn: or('taperIn', 0),
    overDigFt: or('overDigFt', 0),
    tolBoreIn: or('tolBoreIn', K * uncertainty.boreIn),
    tolPoleTableIn: or('tolPoleIn', K * uncertainty.poleTableIn),
    tolPoleTapedIn: or('tolPoleIn', K * uncertainty.poleTapedIn),
    tolDepthIn: or('tolDepthIn', K * uncertainty.depthIn),
    tolGapIn: or('tolGapIn', K * uncertainty.gapIn),
  };
}

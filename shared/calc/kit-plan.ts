import { yieldFactor } from './waits.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

export type KitPlan = {
  /** Nominal volume that the kits must have, ft³. */
  readonly needFt3: number;
  /** Kit sizes, largest first. */
  readonly kits: readonly number[];
  readonly surplusFt3: number;
};

/** Sizes are kept to a ten-thousandth of a cubic foot, as whole numbers of their common measure. */
const GRAIN = 10_000;
/** Beyond so many sums the choice is refused rather than slow: far above any one void. */
const MOST_SUMS = 2_000_000;
const SLACK = 1e-9;

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/** Fewest kits for each sum of kits up to `last`, 0 where none; `units` largest first. */
function fewestKits(units: readonly number[], last: number): Uint32Array {
  const fewest = new Uint32Array(last + 1);
  for (let sum = 1; sum <= last; sum += 1) {
    let best = 0;
    for (const unit of units) {
      if (unit > sum) continue;
      const rest = sum === unit ? 0 : (fewest[sum - unit] ?? 0);
      if (sum !== unit && rest === 0) continue;
      if (best === 0 || rest + 1 < best) best = rest + 1;
    }
    fewest[sum] = best;
  }
  return fewest;
}

/** One set with the fewest kits for a sum, largest kit first. */
function kitsOf(sum: number, units: readonly number[], fewest: Uint32Array): number[] {
  const kits: number[] = [];
  let left = sum;
  while (left > 0) {
    const wanted = (fewest[left] ?? 0) - 1;
    const unit = units.find(
      (unit) => unit <= left && (unit === left ? wanted === 0 : wanted > 0 && fewest[left - unit] === wanted),
    );
    if (unit === undefined) return [];
    kits.push(unit);
    left -= unit;
  }
  return kits;
}

/**
 * The exact choice of kits for a need in ft³. Among sets with a surplus of at most `band`: fewest kits, then least surplus, then largest
 * kit first; if there is none, least surplus, then fewest. Null without kits, or for a need beyond reason.
 */
export function chooseKits(
  needFt3: number,
  sizesFt3: readonly number[],
  band: number,
): Omit<KitPlan, 'needFt3'> | null {
  if (!Number.isFinite(needFt3) || needFt3 < 0) return null;
  if (needFt3 <= SLACK) return { kits: [], surplusFt3: 0 };
  const grains = [...new Set(sizesFt3.map((size) => Math.round(size * GRAIN)))].filter((grain) => grain > 0);
  const measure = grains.reduce(gcd, 0);
  if (measure === 0) return null;
  const units = grains.map((grain) => grain / measure).sort((a, b) => b - a);
  const volume = (sum: number) => (sum * measure) / GRAIN;
  const first = Math.ceil((needFt3 - SLACK) * (GRAIN / measure));
  // A set that cannot spare any kit exceeds the need by less than its largest.
  const last = first + Math.max(units[0] ?? 0, Math.floor((band * GRAIN) / measure));
  if (last > MOST_SUMS) return null;
  const fewest = fewestKits(units, last);

  let within: number | null = null;
  let least: number | null = null;
  for (let sum = first; sum <= last; sum += 1) {
    const count = fewest[sum] ?? 0;
    if (count === 0) continue;
    least ??= sum;
    if (volume(sum) - needFt3 > band + SLACK) break;
    if (within === null || count < (fewest[within] ?? 0)) within = sum;
  }
  const sum = within ?? least;
  if (sum === null) return null;
  return {
    kits: kitsOf(sum, units, fewest).map(volume),
    surplusFt3: Math.max(0, volume(sum) - needFt3),
  };
}

/** Kits for a void at the planned component temperature in °F: need = void·(1 + allowance) over the yield there. Null as `chooseKits`. */
export function planKits({
  voidFt3,
  tempF,
  product,
  standard,
}: {
  readonly voidFt3: number;
  readonly tempF: number;
  readonly product: Product;
  readonly standard: Standard;
}): KitPlan | null {
  const { allowanceShare, surplusFt3, surplusShare } = standard.kits;
  const needFt3 = (voidFt3 * (1 + allowanceShare)) / yieldFactor(product, tempF);
  const chosen = chooseKits(needFt3, product.kitsFt3, Math.max(surplusFt3, surplusShare * needFt3));
  return chosen === null ? null : { needFt3, ...chosen };
}

/** Order list of many plans: kits by size with spares on top, each size's spares rounded up. */
export function orderList(
  plans: readonly KitPlan[],
  spareShare: number,
): { readonly kitFt3: number; readonly planned: number; readonly spares: number }[] {
  const counts = new Map<number, number>();
  for (const kit of plans.flatMap(({ kits }) => kits)) counts.set(kit, (counts.get(kit) ?? 0) + 1);
  return [...counts]
    .sort(([a], [b]) => b - a)
    .map(([kitFt3, planned]) => ({
      kitFt3,
      planned,
      spares: Math.max(0, Math.ceil(planned * spareShare - SLACK)),
    }));
}

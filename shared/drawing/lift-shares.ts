import type { SheetPour } from './sheet-types.ts';

type Lift = { readonly event: number; readonly pour: number; volumeFt3: number };

/**
 * Share of the foam that each lift brought, in the order they were poured: by the nominal yield of what was used of its
 * kits. One component colder than another shifts the bands between lifts by a little; their sum is the placed volume.
 * Empty where a row's amount is not known.
 */
export function liftShares(pours: readonly SheetPour[]): number[] {
  const lifts: Lift[] = [];
  for (const { event, pourNumber, kitFt3, quantity, wastedQuantity } of pours) {
    if (kitFt3 === null || quantity === null || pourNumber === null) return [];
    const volumeFt3 = Math.max(0, quantity - (wastedQuantity ?? 0)) * kitFt3;
    const lift = lifts.find((one) => one.event === (event ?? 1) && one.pour === pourNumber);
    if (lift) lift.volumeFt3 += volumeFt3;
    else lifts.push({ event: event ?? 1, pour: pourNumber, volumeFt3 });
  }
  const total = lifts.reduce((sum, lift) => sum + lift.volumeFt3, 0);
  if (!(total > 0)) return [];
  return lifts
    .toSorted((a, b) => a.event - b.event || a.pour - b.pour)
    .map((lift) => lift.volumeFt3 / total)
    .filter((share) => share > 0);
}

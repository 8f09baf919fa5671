import { formatNumber } from '#shared/units/format-quantity.ts';

/** Kits by size, largest first. */
export function kitCounts(kits: readonly number[]): { readonly kitFt3: number; readonly count: number }[] {
  const counts = new Map<number, number>();
  for (const kit of kits) counts.set(kit, (counts.get(kit) ?? 0) + 1);
  return [...counts].sort(([a], [b]) => b - a).map(([kitFt3, count]) => ({ kitFt3, count }));
}

/** `2 × 8 + 2.5`: kits in ft³. Kit sizes are the maker's names and are not converted. */
export function kitsText(kits: readonly number[]): string {
  if (kits.length === 0) return 'none';
  return kitCounts(kits)
    .map(({ kitFt3, count }) => `${count > 1 ? `${count} × ` : ''}${formatNumber(kitFt3, { digits: 4 })}`)
    .join(' + ');
}

/** Cost of kits by their prices; null where a size has none. */
export function kitsCost(kits: readonly number[], priceOf: (kitFt3: number) => number | null): number | null {
  let cost = 0;
  for (const kit of kits) {
    const price = priceOf(kit);
    if (price === null) return null;
    cost += price;
  }
  return cost;
}

import type { ProductInForce, StandardInForce } from '#shared/rules/types.ts';

/** The last version in effect on a day; before the first, the first; without a day, the last. Versions ascend by `effectiveOn`. */
const inForce = <T extends { readonly effectiveOn: string }>(
  versions: readonly T[],
  day: string | null,
): T | null => {
  if (day === null) return versions.at(-1) ?? null;
  return versions.findLast((version) => version.effectiveOn <= day) ?? versions[0] ?? null;
};

export const standardInForce = (
  standards: readonly StandardInForce[],
  day: string | null,
): StandardInForce | null => inForce(standards, day);

/** A product is known by its code, whatever the case it was written in. */
export const productInForce = (
  products: readonly ProductInForce[],
  code: string,
  day: string | null,
): ProductInForce | null => {
  const wanted = code.trim().toUpperCase();
  const versions = products.filter((product) => product.code.toUpperCase() === wanted);
  return inForce(versions, day);
};

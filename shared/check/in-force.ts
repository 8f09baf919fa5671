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

const byCode = new WeakMap<readonly ProductInForce[], ReadonlyMap<string, readonly ProductInForce[]>>();

/** The versions of each product; made once for a context, since every pour asks. */
const productIndex = (
  products: readonly ProductInForce[],
): ReadonlyMap<string, readonly ProductInForce[]> => {
  const before = byCode.get(products);
  if (before) return before;
  const index = new Map<string, ProductInForce[]>();
  for (const product of products) {
    const code = product.code.toUpperCase();
    const versions = index.get(code);
    if (versions) versions.push(product);
    else index.set(code, [product]);
  }
  byCode.set(products, index);
  return index;
};

/** A product is known by its code, whatever the case it was written in. */
export const productInForce = (
  products: readonly ProductInForce[],
  code: string,
  day: string | null,
): ProductInForce | null => inForce(productIndex(products).get(code.trim().toUpperCase()) ?? [], day);

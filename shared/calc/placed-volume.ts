import { yieldFactor } from './waits.ts';
import type { Product } from '#shared/standard/types.ts';

/** What a pour row says of its amount; fields are null where blank or unreadable. A rule's `Pour` is one. */
export type PourAmount = {
  readonly kitFt3: number | null;
  readonly quantity: number | null;
  readonly wastedQuantity: number;
  readonly componentATempF: number | null;
  readonly componentBTempF: number | null;
};

/** The colder of a row's two components in °F; null unless both are known. */
export function colderComponentF(pour: PourAmount): number | null {
  const { componentATempF: a, componentBTempF: b } = pour;
  return a === null || b === null ? null : Math.min(a, b);
}

/** The coldest component over the rows of a pour in °F; null for no rows, or where one is not known. */
export function coldestComponentF(pours: readonly PourAmount[]): number | null {
  let coldest: number | null = null;
  for (const pour of pours) {
    const colder = colderComponentF(pour);
    if (colder === null) return null;
    coldest = coldest === null ? colder : Math.min(coldest, colder);
  }
  return coldest;
}

/** Risen foam placed, ft³: Σ (quantity − wasted) × nominal yield × yield factor. Null without a pour, a product, or a value of any row. */
export function placedVolume(pours: readonly PourAmount[], product: Product | null): number | null {
  if (product === null || pours.length === 0) return null;
  let placed = 0;
  for (const pour of pours) {
    const tempF = colderComponentF(pour);
    if (tempF === null || pour.kitFt3 === null || pour.quantity === null) return null;
    const used = Math.max(0, pour.quantity - pour.wastedQuantity);
    placed += used * pour.kitFt3 * yieldFactor(product, tempF);
  }
  return Number.isFinite(placed) ? placed : null;
}

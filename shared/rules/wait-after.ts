import { temperatureFactor } from '#shared/calc/waits.ts';
import type { Product } from '#shared/standard/types.ts';
import type { PourGroup } from './line-events.ts';

/** Coldest component of a pour in °F; null when no temperature is known. */
const coldestOf = (pour: PourGroup): number | null => {
  let coldest = Infinity;
  for (const row of pour.rows) {
    coldest = Math.min(coldest, row.componentATempF ?? Infinity, row.componentBTempF ?? Infinity);
  }
  return Number.isFinite(coldest) ? coldest : null;
};

/**
 * The wait due after a pour, in minutes: the standard's wait times the product's factor for the pour's coldest
 * component. Without a temperature or a product the factor is 1: what is too early even so is too early.
 */
export const waitAfter = ({
  pour,
  product,
  waitMin,
}: {
  readonly pour: PourGroup;
  readonly product: Product | null;
  readonly waitMin: number;
}): { readonly minutes: number; readonly factor: number; readonly coldestF: number | null } => {
  const coldestF = coldestOf(pour);
  const factor = product === null || coldestF === null ? 1 : temperatureFactor(product, coldestF);
  return { minutes: waitMin * factor, factor, coldestF };
};

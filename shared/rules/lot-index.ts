import { structureKey } from '#shared/records/structure-key.ts';
import type { LotFact } from './types.ts';

/** A lot is the same when its number differs only in case and spaces. */
export const lotKey = (product: string, lot: string): string =>
  `${structureKey(product)}|${structureKey(lot)}`;

const made = new WeakMap<readonly LotFact[], ReadonlyMap<string, LotFact>>();

/** The lots by key; made once for a context, so that a check stays linear in its lines. */
export const lotIndex = (lots: readonly LotFact[]): ReadonlyMap<string, LotFact> => {
  const before = made.get(lots);
  if (before) return before;
  const index = new Map(lots.map((lot) => [lotKey(lot.product, lot.number), lot]));
  made.set(lots, index);
  return index;
};

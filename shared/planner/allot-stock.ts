import type { OrderLine } from './plan-order.ts';

/** Kits of one lot, by size, as far as they are not used. */
export type StockLot = {
  readonly number: string;
  readonly expiresOn: string | null;
  readonly status: 'in-use' | 'held' | 'recalled';
  readonly sizes: readonly { readonly kitFt3: number; readonly left: number }[];
};

export type Allotted = OrderLine & {
  readonly wanted: number;
  /** Kits taken from each lot, first to expire first. */
  readonly from: readonly {
    readonly lot: string;
    readonly expiresOn: string | null;
    readonly kits: number;
  }[];
  /** Kits at hand that may be used, taken or not. */
  readonly atHand: number;
  readonly short: number;
  /** Counted by hand: the lots of that size do not matter. */
  readonly byHand: boolean;
};

const same = (a: number, b: number) => Math.abs(a - b) < 1e-6;

/** Why a lot is not counted on a day `YYYY-MM-DD`; null: it is. */
export function lotBarred(
  { status, expiresOn }: StockLot,
  day: string,
): 'held' | 'recalled' | 'expired' | null {
  if (status !== 'in-use') return status;
  return expiresOn !== null && expiresOn < day ? 'expired' : null;
}

/** Lots in the order in which they are used up: first to expire first, those without a day last. */
function byExpiry(lots: readonly StockLot[]): StockLot[] {
  return [...lots].sort(
    (a, b) =>
      (a.expiresOn ?? '9999').localeCompare(b.expiresOn ?? '9999') || a.number.localeCompare(b.number, 'en'),
  );
}

/**
 * What of an order stands in stock, lot by lot, and what is short. Held, recalled and expired lots do not count. Counts typed by size,
 * where there are any, stand for the lots of that size.
 */
export function allotStock(
  lines: readonly OrderLine[],
  options: {
    readonly lots: readonly StockLot[];
    readonly day: string;
    readonly typed: (kitFt3: number) => number | null;
  },
): readonly Allotted[] {
  const usable = byExpiry(options.lots.filter((lot) => lotBarred(lot, options.day) === null));
  return lines.map((line) => {
    const wanted = line.planned + line.spares;
    const typed = options.typed(line.kitFt3);
    if (typed !== null)
      return { ...line, wanted, from: [], atHand: typed, short: Math.max(0, wanted - typed), byHand: true };
    let [left, atHand] = [wanted, 0];
    const from: { lot: string; expiresOn: string | null; kits: number }[] = [];
    for (const { number, expiresOn, sizes } of usable) {
      const size = sizes.find(({ kitFt3 }) => same(kitFt3, line.kitFt3));
      const there = Math.max(0, Math.floor(size?.left ?? 0));
      atHand += there;
      const kits = Math.min(left, there);
      if (kits > 0) from.push({ lot: number, expiresOn, kits });
      left -= kits;
    }
    return { ...line, wanted, from, atHand, short: left, byHand: false };
  });
}

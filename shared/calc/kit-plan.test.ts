import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { chooseKits, orderList } from './kit-plan.ts';

/** Every set of up to `most` kits, largest first, as sums of whole tenths. */
function everySet(sizes: readonly number[], most: number): number[][] {
  if (most === 0) return [[]];
  const shorter = everySet(sizes, most - 1);
  const longer = shorter
    .filter((set) => set.length === most - 1)
    .flatMap((set) => sizes.filter((size) => size <= (set.at(-1) ?? Infinity)).map((size) => [...set, size]));
  return [...shorter, ...longer];
}

const sum = (set: readonly number[]) => Math.round(set.reduce((a, b) => a + b, 0) * 10) / 10;

describe('choice of kits', () => {
  test('is the best of all sets, tried one by one', () => {
    const sizes = fc.uniqueArray(
      fc.integer({ min: 10, max: 60 }).map((tenths) => tenths / 10),
      {
        minLength: 1,
        maxLength: 4,
      },
    );
    fc.assert(
      fc.property(
        sizes,
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 0, max: 15 }),
        (sizes, need, band) => {
          const [needFt3, bandFt3] = [need / 10, band / 10];
          const sets = everySet(sizes, 8).filter((set) => sum(set) >= needFt3);
          const within = sets.filter((set) => sum(set) - needFt3 <= bandFt3 + 1e-9);
          const byKits = (a: number[], b: number[]) => a.length - b.length;
          const bySurplus = (a: number[], b: number[]) => sum(a) - sum(b);
          const byLargest = (a: number[], b: number[]) => {
            const at = a.findIndex((size, index) => size !== b[index]);
            return at < 0 ? 0 : (b[at] ?? 0) - (a[at] ?? 0);
          };
          const best =
            within.length > 0
              ? within.sort((a, b) => byKits(a, b) || bySurplus(a, b) || byLargest(a, b))[0]
              : sets.sort((a, b) => bySurplus(a, b) || byKits(a, b) || byLargest(a, b))[0];
          expect(chooseKits(needFt3, sizes, bandFt3)?.kits).toEqual(best);
        },
      ),
    );
  });

  test('two kits that fit beat the larger one that a greedy choice takes', () => {
    expect(chooseKits(6.48, [1.5, 2.5, 4, 6, 8], 0.648)?.kits).toEqual([4, 2.5]);
  });

  test('sizes need not be halves', () => {
    expect(chooseKits(2.74, [1.37, 2.3], 0)).toEqual({ kits: [1.37, 1.37], surplusFt3: 0 });
  });

  test('nothing needed, nothing sold, nothing sensible', () => {
    expect(chooseKits(0, [1.5], 0.5)).toEqual({ kits: [], surplusFt3: 0 });
    expect(chooseKits(3, [], 0.5)).toBeNull();
    expect(chooseKits(Number.NaN, [1.5], 0.5)).toBeNull();
    expect(chooseKits(1e9, [1.5], 0.5)).toBeNull();
  });
});

test('an order list counts kits by size, with spares rounded up', () => {
  const plan = (kits: number[]) => ({ needFt3: 1, surplusFt3: 0, kits });
  expect(orderList([plan([8, 2.5]), plan([8]), plan([8, 1.5])], 0.05)).toEqual([
    { kitFt3: 8, planned: 3, spares: 1 },
    { kitFt3: 2.5, planned: 1, spares: 1 },
    { kitFt3: 1.5, planned: 1, spares: 1 },
  ]);
  expect(orderList([plan([8])], 0)).toEqual([{ kitFt3: 8, planned: 1, spares: 0 }]);
});

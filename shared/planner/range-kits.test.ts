import fc from 'fast-check';
import { expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { assumptionsOf } from './assumptions.ts';
import { kitCounts, kitsCost, kitsText } from './kits-text.ts';
import { kitAnswer } from './range-kits.ts';
import { readPlan } from './read-plan.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
const answer = (voidFt3: number, typed: Record<string, string> = {}) =>
  kitAnswer(voidFt3, assumptionsOf(readPlan({ kind: 'set', ...typed }), CONTEXT), CONTEXT);

it.each([
  // Worked records WK1 to WK6: void, temperature, need, kits, surplus (computed apart from the product).
  [5.8905, 72, 6.4796, [4, 2.5], 0.0204],
  [9.1185, 72, 10.0304, [8, 2.5], 0.4696],
  [1, 72, 1.1, [1.5], 0.4],
  [20, 50, 24.4444, [8, 8, 6, 2.5], 0.0556],
  [3.4, 72, 3.74, [4], 0.26],
  [7, 95, 7.8974, [8], 0.1026],
])('%d ft³ at %d °F', (voidFt3, tempF, need, kits, surplus) => {
  const found = answer(voidFt3, { tempF: String(tempF) });
  expect(found?.needFt3).toBeCloseTo(need, 3);
  expect(found?.kits).toEqual(kits);
  expect(found?.surplusFt3).toBeCloseTo(surplus, 3);
});

it('rises less in the cold', () => {
  // WK4's kits, 24.5 ft³ by name, at 50 °F: factor 0.9 between 0.80 at 40 °F and 1.00 at 60 °F.
  expect(answer(20, { tempF: '50' })?.placedFt3).toBeCloseTo(22.05, 6);
});

/** Every count of each size up to a bound, tried one after the other: no order, no pruning. */
function best(sizes: readonly number[], need: number): number[] {
  const sorted = [...sizes].sort((a, b) => b - a);
  const most = Math.ceil(need / Math.min(...sizes)) + 1;
  let sets: number[][] = [[]];
  for (const size of sorted)
    sets = sets.flatMap((set) =>
      Array.from({ length: most + 1 }, (_, n) => [...set, ...Array.from({ length: n }, () => size)]),
    );
  const volume = (set: readonly number[]) => set.reduce((sum, kit) => sum + Math.round(kit * 100), 0) / 100;
  const band = Math.max(0.5, 0.1 * need);
  const covering = sets.filter((set) => volume(set) >= need - 1e-9);
  const within = covering.filter((set) => volume(set) - need <= band + 1e-9);
  const largest = (a: readonly number[], b: readonly number[]) => {
    const at = a.findIndex((kit, index) => Math.abs(kit - (b[index] ?? 0)) > 1e-9);
    return at < 0 ? 0 : (b[at] ?? 0) - (a[at] ?? 0);
  };
  const bySurplus = (a: readonly number[], b: readonly number[]) => {
    const apart = volume(a) - volume(b);
    return Math.abs(apart) < 1e-9 ? 0 : apart;
  };
  const order =
    within.length > 0
      ? (a: number[], b: number[]) => a.length - b.length || bySurplus(a, b) || largest(a, b)
      : (a: number[], b: number[]) => bySurplus(a, b) || a.length - b.length || largest(a, b);
  return (within.length > 0 ? within : covering).sort(order)[0] ?? [];
}

it('is the best set there is, by trying every one, whatever sizes are sold and however cold it is', () => {
  const sizes = fc.uniqueArray(
    fc.integer({ min: 100, max: 900 }).map((hundredths) => hundredths / 100),
    {
      minLength: 1,
      maxLength: 4,
    },
  );
  fc.assert(
    fc.property(
      sizes,
      fc.integer({ min: 1, max: 70 }),
      fc.integer({ min: 40, max: 100 }),
      (sizes, tenths, tempF) => {
        const found = answer(tenths / 10, { tempF: String(tempF), kitsFt3: sizes.join(', ') });
        expect(found?.kits).toEqual(best(sizes, found?.needFt3 ?? 0));
      },
    ),
    { numRuns: 150 },
  );
});

it('reads as people write kits', () => {
  expect(kitsText([8, 8, 2.5])).toBe('2 × 8 + 2.5');
  expect(kitsText([])).toBe('none');
  expect(kitCounts([2.5, 8, 8])).toEqual([
    { kitFt3: 8, count: 2 },
    { kitFt3: 2.5, count: 1 },
  ]);
  expect(kitsCost([8, 8, 2.5], (kit) => (kit === 8 ? 90 : 40))).toBe(220);
  expect(kitsCost([8, 2.5], (kit) => (kit === 8 ? 90 : null))).toBeNull();
});

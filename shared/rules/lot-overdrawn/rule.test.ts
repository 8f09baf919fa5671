import { describe, expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { lineOf, pourOf, sourceRow } from '../testing.ts';
import type { LotUse, Pour } from '../types.ts';
import { lotOverdrawn } from './rule.ts';

const find = (pours: readonly Pour[], lotUse: readonly LotUse[] | null) =>
  lotOverdrawn.check(
    { lines: [lineOf({ pours })], pours, orphans: [], batch: sourceRow('Batch', 1, {}) },
    {},
    { ...DEMO_CONTEXT, lotUse },
  );
/** Of ten kits of 8 ft³, seven are used elsewhere, two of them by this contractor. */
const USE: LotUse = {
  product: 'EP-15',
  number: 'L-100',
  sizes: [{ kitFt3: 8, received: 10, used: 7, own: 2 }],
};

describe('lot-overdrawn', () => {
  it.each([
    ['the last kits of the lot', [pourOf({ quantity: 3 })], [USE]],
    ['a lot that is not known', [pourOf({ lot: 'L-9', quantity: 30 })], [USE]],
    ['quantity unreadable', [pourOf({ quantity: null }, ['quantity'])], [USE]],
    [
      'overdrawn by others, not used here',
      [],
      [{ ...USE, sizes: [{ kitFt3: 8, received: 1, used: 7, own: 0 }] }],
    ],
    ['a size that the product lacks: kit-unknown says so', [pourOf({ kitFt3: 5 })], [USE]],
    ['use not known here', [pourOf({ quantity: 30 })], null],
  ])('meets: %s', (_name, pours, lotUse) => {
    expect(find(pours, lotUse)).toEqual([]);
  });

  it('finds: one kit too many, in two pours; what others used is for the owner alone', () => {
    expect(find([pourOf({ quantity: 3 }), pourOf({ lot: 'l-100' })], [USE])).toEqual([
      {
        field: null,
        part: 'EP-15|L-100 8',
        measured: 6,
        limit: null,
        margin: null,
        unit: 'count',
        params: { product: 'EP-15', lot: 'L-100', kitFt3: 8 },
        ownerParams: { used: 11, received: 10, over: 1 },
      },
    ]);
  });

  it('finds: a size that was never received, apart from the others', () => {
    expect(find([pourOf(), pourOf({ kitFt3: 4 })], [USE])).toMatchObject([
      { measured: 1, params: { kitFt3: 4 }, ownerParams: { used: 1, received: 0 } },
    ]);
  });
});

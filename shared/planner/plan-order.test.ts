import { describe, expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { allotStock, lotBarred, type StockLot } from './allot-stock.ts';
import { orderCsv } from './order-csv.ts';
import { PLAN_DEFAULTS } from './plan-fields.ts';
import { planOrder, type DesignStructure } from './plan-order.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
const pole = (n: number, design: Partial<DesignStructure['design']> = {}): DesignStructure => ({
  id: `id-${n}`,
  structureNumber: `17-04${n}`,
  kind: 'set',
  design: {
    poleLengthFt: 40,
    poleClass: '4',
    poleMaterial: 'southern-pine',
    ground: 'soil',
    embedmentFt: null,
    ...design,
  },
});
/** Twenty inch augers alone, so that each pole is that of WR-02: void 9.1185 ft³, kits 8 + 2.5 (WK2). */
const TEXTS = { ...PLAN_DEFAULTS, augersIn: '20' };
const lot = (number: string, rest: Partial<StockLot> = {}): StockLot => ({
  number,
  expiresOn: '2027-06-01',
  status: 'in-use',
  sizes: [{ kitFt3: 8, left: 2 }],
  ...rest,
});

describe('a work order', () => {
  it('adds up its poles, with spares on top', () => {
    const plan = planOrder([pole(1), pole(2), pole(3)], TEXTS, { context: CONTEXT });
    expect(plan.voidFt3).toBeCloseTo(3 * 9.1185, 3);
    // 5 % of three kits is a part of one, and a spare is a whole kit.
    expect(plan.lines).toEqual([
      { kitFt3: 8, planned: 3, spares: 1 },
      { kitFt3: 2.5, planned: 3, spares: 1 },
    ]);
  });

  it('plans each structure by its own design, whatever was typed for another', () => {
    const texts = { ...TEXTS, poleLengthFt: '60', embedmentFt: '9', boreIn: '30', waterIn: '3' };
    const [first, second] = planOrder([pole(1), pole(2, { embedmentFt: 7 })], texts, {
      context: CONTEXT,
    }).rows;
    expect(first?.plan.depthFt).toBe(6);
    expect(first?.plan.boreIn).toBe(20);
    expect(second?.plan.depthFt).toBe(7);
  });

  it('counts what cannot be planned yet', () => {
    const plan = planOrder([pole(1), pole(2, { poleClass: null }), { ...pole(3), kind: 'relevel' }], TEXTS, {
      context: CONTEXT,
    });
    expect(plan.unplanned).toBe(2);
    expect(plan.rows[1]?.plan.faults[0]?.text).toBe('Choose the class of the pole, or tape it.');
  });
});

describe('stock', () => {
  const line = { kitFt3: 8, planned: 5, spares: 1 };
  const none = () => null;

  it('is taken from the lot that expires first, and the rest is short', () => {
    const lots = [
      lot('B', { expiresOn: '2027-09-01' }),
      lot('A', { expiresOn: '2027-01-01' }),
      lot('C', { expiresOn: null }),
    ];
    expect(allotStock([line], { lots: lots.slice(0, 2), day: '2026-12-01', typed: none })[0]).toEqual({
      ...line,
      wanted: 6,
      atHand: 4,
      short: 2,
      byHand: false,
      from: [
        { lot: 'A', expiresOn: '2027-01-01', kits: 2 },
        { lot: 'B', expiresOn: '2027-09-01', kits: 2 },
      ],
    });
    expect(allotStock([line], { lots, day: '2026-12-01', typed: none })[0]?.short).toBe(0);
  });

  it('does not count lots that are held, recalled or expired', () => {
    const lots = [
      lot('H', { status: 'held' }),
      lot('R', { status: 'recalled' }),
      lot('E', { expiresOn: '2026-11-30' }),
      lot('T', { expiresOn: '2026-12-01' }),
    ];
    expect(lots.map((one) => lotBarred(one, '2026-12-01'))).toEqual(['held', 'recalled', 'expired', null]);
    expect(allotStock([line], { lots, day: '2026-12-01', typed: none })[0]?.atHand).toBe(2);
  });

  it('is what was counted by hand where that is typed; a balance below zero is none', () => {
    expect(allotStock([line], { lots: [lot('A')], day: '2026-12-01', typed: () => 7 })[0]).toMatchObject({
      atHand: 7,
      short: 0,
      byHand: true,
    });
    const overdrawn = [lot('A', { sizes: [{ kitFt3: 8, left: -3 }] })];
    expect(allotStock([line], { lots: overdrawn, day: '2026-12-01', typed: none })[0]?.short).toBe(6);
  });
});

it('goes out as CSV', () => {
  const plan = planOrder([pole(1)], TEXTS, { context: CONTEXT });
  const allotted = allotStock(plan.lines, { lots: [], day: '2026-12-01', typed: () => null });
  const lines = orderCsv(plan, { allotted, priceOf: (kit) => (kit === 8 ? 90 : null) }).split('\r\n');
  expect(lines[1]).toMatch(/^17-041,set,6,20,[\d.]+,9\.1185,[\d.]+,8 \+ 2\.5,$/);
  expect(lines.slice(4, 6)).toEqual(['8,1,1,2,0,2,180', '2.5,1,1,2,0,2,']);
});

import { describe, expect, test } from 'vitest';
import { planKits } from '#shared/calc/kit-plan.ts';
import { leanDeviation } from '#shared/calc/lean.ts';
import { strengthShare } from '#shared/calc/strength-share.ts';
import { waitAt } from '#shared/calc/waits.ts';
import { waterWithPoleOf } from '#shared/calc/water-with-pole.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

// Source: single worked values on the demo standard and product, computed apart from the product. Status: derived, not published.

test.each([
  { id: 'WK1', voidFt3: 5.8905, tempF: 72, need: 6.4796, kits: [4, 2.5], surplus: 0.0204 },
  { id: 'WK2', voidFt3: 9.1185, tempF: 72, need: 10.0304, kits: [8, 2.5], surplus: 0.4696 },
  { id: 'WK3', voidFt3: 1, tempF: 72, need: 1.1, kits: [1.5], surplus: 0.4 },
  { id: 'WK4', voidFt3: 20, tempF: 50, need: 24.4444, kits: [8, 8, 6, 2.5], surplus: 0.0556 },
  { id: 'WK5', voidFt3: 3.4, tempF: 72, need: 3.74, kits: [4], surplus: 0.26 },
  { id: 'WK6', voidFt3: 7, tempF: 95, need: 7.8974, kits: [8], surplus: 0.1026 },
])('$id kits for a void of $voidFt3 ft³ at $tempF °F', ({ voidFt3, tempF, need, kits, surplus }) => {
  const plan = planKits({ voidFt3, tempF, product: DEMO_PRODUCT, standard: DEMO_STANDARD });
  expect(plan?.kits).toEqual(kits);
  expect(plan?.needFt3).toBeCloseTo(need, 3);
  expect(plan?.surplusFt3).toBeCloseTo(surplus, 3);
});

test.each([
  { id: 'WS1', minutes: 15, tempF: 72, share: 0.6612 },
  { id: 'WS2', minutes: 3, tempF: 72, share: 0.5 },
  { id: 'WS3', minutes: 60, tempF: 72, share: 0.8 },
  { id: 'WS4', minutes: 30, tempF: 50, share: 0.69 },
  { id: 'WS5', minutes: 360, tempF: 72, share: 0.9442 },
  { id: 'WS6', minutes: 1, tempF: 72, share: 0.1667 },
])('$id share of strength after $minutes min at $tempF °F', ({ minutes, tempF, share }) => {
  expect(Math.abs(strengthShare({ minutes, tempF, product: DEMO_PRODUCT }) - share)).toBeLessThan(0.0005);
});

test.each([
  { id: 'WT1', waitMin: 15, tempF: 50, due: 22.5 },
  { id: 'WT2', waitMin: 60, tempF: 40, due: 120 },
  { id: 'WT3', waitMin: 3, tempF: 72, due: 3 },
  { id: 'WT4', waitMin: 15, tempF: 57, due: 17.25 },
])('$id wait of $waitMin min at $tempF °F', ({ waitMin, tempF, due }) => {
  expect(waitAt({ waitMin, tempF, product: DEMO_PRODUCT })).toBeCloseTo(due, 9);
});

test.each([
  { id: 'WL1', lean: [2, 0], rake: [2, 180], deviation: 4 },
  { id: 'WL2', lean: [1.2, 90], rake: [1, 95], deviation: 0.2217 },
  { id: 'WL3', lean: [0.8, 45], rake: [0, 0], deviation: 0.8 },
] as const)('$id lean $lean against rake $rake', ({ lean, rake, deviation }) => {
  const of = ([inPer10Ft, azimuthDeg]: readonly [number, number]) => ({ inPer10Ft, azimuthDeg });
  expect(Math.abs((leanDeviation(of(lean), of(rake)) ?? Number.NaN) - deviation)).toBeLessThan(0.0005);
});

describe('water in the open bore, then a crushed-stone bed and the pole on it', () => {
  test.each([
    { id: 'WB1', waterIn: 1.2, boreIn: 20, bedIn: 6, buttIn: 12, withPole: 3 },
    { id: 'WB2', waterIn: 3.5, boreIn: 20, bedIn: 6, buttIn: 12, withPole: 7.7188 },
    { id: 'WB3', waterIn: 3, boreIn: 18, bedIn: 4, buttIn: 12, withPole: 6.52 },
  ])('$id', ({ waterIn, boreIn, bedIn, buttIn, withPole }) => {
    const values = {
      waterIn,
      boreTopIn: boreIn,
      boreDepthFt: 6 + bedIn / 12,
      embedmentFt: 6,
      bedMaterial: 'crushed-stone',
      bedFt: bedIn / 12,
      diameterGroundLineIn: buttIn,
      diameterButtIn: buttIn,
    };
    const level = waterWithPoleOf(values, DEMO_STANDARD.bedPorosity);
    expect(Math.abs((level ?? Number.NaN) - withPole)).toBeLessThan(0.002);
  });
});

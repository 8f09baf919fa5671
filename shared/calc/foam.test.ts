import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { coldestComponentF, placedVolume } from './placed-volume.ts';
import { strengthShare } from './strength-share.ts';
import { temperatureFactor, yieldFactor } from './waits.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';

// The demo product's own tables; between points by straight lines, worked by hand.
describe('factors by temperature', () => {
  test.each([
    [20, 0.8, 2],
    [40, 0.8, 2],
    [50, 0.9, 1.5],
    [60, 1, 1],
    [75, 1, 1],
    [95, 0.975, 1],
    [120, 0.95, 1],
  ])('%d °F', (tempF, ofYield, ofWaits) => {
    expect(yieldFactor(DEMO_PRODUCT, tempF)).toBeCloseTo(ofYield, 12);
    expect(temperatureFactor(DEMO_PRODUCT, tempF)).toBeCloseTo(ofWaits, 12);
  });
});

describe('placed volume', () => {
  const pour = { kitFt3: 4, quantity: 3, wastedQuantity: 1, componentATempF: 72, componentBTempF: 50 };

  test('leaves out the wasted, by the colder component', () => {
    expect(placedVolume([pour], DEMO_PRODUCT)).toBeCloseTo(7.2, 12);
    expect(placedVolume([{ ...pour, wastedQuantity: 5 }], DEMO_PRODUCT)).toBe(0);
  });

  test('the coldest component of a pour is known when all are', () => {
    expect(coldestComponentF([pour, { ...pour, componentATempF: 41 }])).toBe(41);
    expect(coldestComponentF([pour, { ...pour, componentATempF: null }])).toBeNull();
    expect(coldestComponentF([])).toBeNull();
  });
});

describe('share of strength', () => {
  const share = (minutes: number, tempF = 72) => strengthShare({ minutes, tempF, product: DEMO_PRODUCT });

  test('ends', () => {
    expect([share(-1), share(0), share(1.5), share(720), share(5000)]).toEqual([0, 0, 0.25, 1, 1]);
  });

  test('never falls with time, never gains by cold', () => {
    const minutes = fc.double({ min: 0, max: 2000, noNaN: true });
    const temps = fc.double({ min: 20, max: 120, noNaN: true });
    fc.assert(
      fc.property(minutes, minutes, temps, (a, b, tempF) => {
        expect(share(Math.max(a, b), tempF)).toBeGreaterThanOrEqual(share(Math.min(a, b), tempF));
        expect(share(a, 40)).toBeLessThanOrEqual(share(a, tempF) + 1e-12);
      }),
    );
  });
});

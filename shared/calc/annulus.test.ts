import { expect, test } from 'vitest';
import { greatestAnnulusIn, leastAnnulusIn } from './annulus.ts';

const set = {
  boreTopIn: 24,
  boreTopAcrossIn: 20,
  boreDepthFt: 6,
  bellIn: 40,
  bellHeightFt: 1,
  diameterGroundLineIn: 10,
  diameterButtIn: 12,
};

test('least bore less greatest pole, greatest bore less least pole, the bell left out', () => {
  expect(leastAnnulusIn(set)).toBe(4);
  expect(greatestAnnulusIn(set)).toBe(7);
});

test('a measured gap counts; a polygon reaches to its corners', () => {
  expect(leastAnnulusIn({ ...set, leastGapIn: 1.5 })).toBe(1.5);
  // Square, 12 in across flats: 16.9706 in corner to corner.
  expect(leastAnnulusIn({ ...set, poleSection: 'square' })).toBeCloseTo((20 - 16.9706) / 2, 4);
  expect(greatestAnnulusIn({ ...set, poleSection: 'square' })).toBe(7);
});

test('a pole wider than its bore has a negative gap; without a bore there is none', () => {
  expect(leastAnnulusIn({ ...set, diameterButtIn: 22 })).toBe(-1);
  expect(leastAnnulusIn({ diameterGroundLineIn: 10, diameterButtIn: 10 })).toBeNull();
  expect(greatestAnnulusIn({})).toBeNull();
});

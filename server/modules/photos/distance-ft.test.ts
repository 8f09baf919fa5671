import { expect, it } from 'vitest';
import { distanceFt } from './distance-ft.ts';

it('is 60 nautical miles for a degree of latitude, within what a sphere can tell', () => {
  // A nautical mile was meant as one minute of latitude: 60 × 1,852 m / 0.3048 m = 364,567 ft; the sphere gives 364,814.
  expect(distanceFt({ latitude: 41, longitude: -97 }, { latitude: 42, longitude: -97 })).toBeCloseTo(
    364_814,
    -1,
  );
});
it('is not known where a position is not', () => {
  expect(distanceFt({ latitude: null, longitude: -97 }, { latitude: 42, longitude: -97 })).toBeNull();
});

import { expect, test } from 'vitest';
import { voidUncertainty } from '#shared/calc/fill-uncertainty.ts';
import { frustumVolume } from '#shared/calc/frustum.ts';

// Source: closed formula, high-precision arithmetic: cylinder, r 10 ± 0.05 in and h 72 ± 0.5 in, independent. Status: derived.
test('uncertainty of a cylinder’s volume', () => {
  const groups = [
    { u: 0.05, shifted: (by: number) => frustumVolume(72, 2 * (10 + by), 2 * (10 + by)), readings: [] },
    { u: 0.5, shifted: (by: number) => frustumVolume(72 + by, 20, 20), readings: [] },
  ];
  expect(frustumVolume(72, 20, 20)).toBeCloseTo(22619.4671058, 6);
  expect(Math.abs(voidUncertainty(groups) / 275.38707344 - 1)).toBeLessThan(1e-8);
});

// Source: JCGM 100:2008, H.1.4, table H.1 (components of the end gauge, nm). Status: secondary transcription.
test('components add in quadrature', () => {
  const groups = [25, 9.7, 2.9, 16.6].map((u) => ({ u, shifted: (by: number) => by, readings: [] }));
  expect(Math.abs(voidUncertainty(groups) - 32)).toBeLessThan(0.5);
});

// Source: JCGM 100:2008, 5.2.2, note 1: with all readings fully correlated the contributions add before they are squared. Status: read.
test('readings of one group add straight', () => {
  const together = [{ u: 0.25, shifted: (by: number) => 3 * by + 4 * by, readings: [] }];
  expect(voidUncertainty(together)).toBeCloseTo(1.75, 9);
});

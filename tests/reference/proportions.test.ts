import { describe, expect, it } from 'vitest';
import { pareto } from '#shared/nonconformities/pareto.ts';
import { scoreInterval } from '#shared/nonconformities/score-interval.ts';

describe('Wilson score interval', () => {
  // R. G. Newcombe, Statistics in Medicine 17 (1998) 857-872, method without continuity correction; secondary transcription.
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [1, 29, 0.0061, 0.1718],
  ])('of %i in %i is as published', (x, n, low, high) => {
    const interval = scoreInterval(x, n);
    expect(Math.abs(interval.low - low)).toBeLessThan(5.5e-5);
    expect(Math.abs(interval.high - high)).toBeLessThan(5.5e-5);
  });

  // E. B. Wilson, JASA 22 (1927) 209-212; values derived from the formula by high-precision arithmetic.
  it.each([
    [23, 60, 0.270882723741, 0.509824041759],
    [0, 10, 0, 0.277532799863],
    [1, 1, 0.206549314377, 1],
    [20, 20, 0.838874841947, 1],
    [2, 125, 0.00439880017919, 0.0564625009305],
    [250, 533, 0.427049643044, 0.511479694701],
  ])('of %i in %i is as derived', (x, n, low, high) => {
    const interval = scoreInterval(x, n);
    expect(interval.low).toBeCloseTo(low, 10);
    expect(interval.high).toBeCloseTo(high, 10);
  });

  it('takes another confidence: 5 of 50 at 90 % (derived)', () => {
    // Standard normal quantile of 0.95.
    const interval = scoreInterval(5, 50, 1.6448536269514722);
    expect(interval.low).toBeCloseTo(0.0495290344774, 10);
    expect(interval.high).toBeCloseTo(0.191537514152, 10);
  });
});

describe('Pareto order', () => {
  // Exact fractions, derived.
  it('falls by count with the running share', () => {
    const rows = pareto([
      { title: 'other', count: 5 },
      { title: 'void', count: 25 },
      { title: 'lean', count: 40 },
      { title: 'depth', count: 20 },
      { title: 'backfill', count: 10 },
    ]);
    expect(rows.map((row) => [row.title, row.count, row.share, Number(row.running.toFixed(12))])).toEqual([
      ['lean', 40, 0.4, 0.4],
      ['void', 25, 0.25, 0.65],
      ['depth', 20, 0.2, 0.85],
      ['backfill', 10, 0.1, 0.95],
      ['other', 5, 0.05, 1],
    ]);
  });

  it('breaks ties by name', () => {
    const rows = pareto([
      { title: 'b', count: 7 },
      { title: 'd', count: 1 },
      { title: 'a', count: 7 },
      { title: 'c', count: 3 },
    ]);
    expect(rows.map((row) => row.title)).toEqual(['a', 'b', 'c', 'd']);
    expect(rows.map((row) => Number((row.running * 100).toFixed(6)))).toEqual([
      38.888889, 77.777778, 94.444444, 100,
    ]);
  });
});

/** Standard normal quantile of 0.975: a two-sided interval of 95 %. */
const Z95 = 1.959963984540054;

/**
 * Score interval of Wilson for a proportion, without continuity correction (E. B. Wilson, JASA 22 (1927) 209-212).
 * @param x how many of `n` have the property; 0 ≤ x ≤ n
 * @returns bounds as shares, 0 to 1; the whole range where n is 0
 */
export function scoreInterval(x: number, n: number, z: number = Z95): { low: number; high: number } {
  if (n <= 0) return { low: 0, high: 1 };
  const p = x / n;
  const middle = p + (z * z) / (2 * n);
  const half = z * Math.sqrt((p * (1 - p)) / n + (z * z) / (4 * n * n));
  const scale = 1 + (z * z) / n;
  return { low: Math.max(0, (middle - half) / scale), high: Math.min(1, (middle + half) / scale) };
}

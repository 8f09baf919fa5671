/** The value below which the share `q` of the list lies; NaN of an empty one. */
export function quantile(values: readonly number[], q: number): number {
  const sorted = values.toSorted((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(q * sorted.length) - 1)] ?? Number.NaN;
}

export const median = (values: readonly number[]): number => quantile(values, 0.5);

const figure = (value: number): string => value.toFixed(value < 10 ? 1 : 0).padStart(7);

/** `p50 … p95 … most …` in milliseconds. */
export const spread = (values: readonly number[]): string =>
  `p50 ${figure(median(values))}   p95 ${figure(quantile(values, 0.95))}   most ${figure(Math.max(...values))} ms`;

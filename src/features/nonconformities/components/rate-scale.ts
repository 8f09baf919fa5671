/** End of an axis of shares: the first round one that holds `high`; the ticks divide it. */
export function rateScale(high: number): { readonly end: number; readonly ticks: readonly number[] } {
  const end = [0.02, 0.05, 0.1, 0.2, 0.5].find((round) => high <= round) ?? 1;
  return { end, ticks: [0, end / 2, end] };
}

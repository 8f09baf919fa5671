/** Where a rising function reaches a value, between two bounds; the nearer bound where it never does. To the last bit. */
export function bisect(
  rising: (x: number) => number,
  value: number,
  [low, high]: readonly [number, number],
): number {
  if (rising(low) >= value) return low;
  if (rising(high) <= value) return high;
  let from = low;
  let to = high;
  for (let step = 0; step < 200; step += 1) {
    const middle = (from + to) / 2;
    if (middle === from || middle === to) break;
    if (rising(middle) < value) from = middle;
    else to = middle;
  }
  return (from + to) / 2;
}

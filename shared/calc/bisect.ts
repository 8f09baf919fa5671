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
  let middle = (from + to) / 2;
  while (from < middle && middle < to) {
    if (rising(middle) < value) from = middle;
    else to = middle;
    middle = (from + to) / 2;
  }
  return middle;
}

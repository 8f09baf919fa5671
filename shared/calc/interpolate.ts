/** y at x on straight lines between points; the nearest point's y outside them. NaN never comes of finite points; no points give 1, the factor that changes nothing. */
export function interpolate(points: readonly (readonly [x: number, y: number])[], x: number): number {
  const sorted = [...points].sort((a, b) => a[0] - b[0]);
  let before = sorted[0];
  if (before === undefined) return 1;
  if (x <= before[0]) return before[1];
  for (const point of sorted) {
    if (x <= point[0]) {
      const span = point[0] - before[0];
      return span === 0 ? point[1] : before[1] + ((point[1] - before[1]) * (x - before[0])) / span;
    }
    before = point;
  }
  return before[1];
}

import { temperatureFactor } from './waits.ts';
import type { Product } from '#shared/standard/types.ts';

/** y at time t between two readings on a straight line in log t; all times above zero. */
export function logInterpolate(
  [t1, y1]: readonly [number, number],
  [t2, y2]: readonly [number, number],
  t: number,
): number {
  return y1 + ((y2 - y1) * Math.log(t / t1)) / Math.log(t2 / t1);
}

/** Time at which y is reached on such a line. */
export function logInterpolateTime(
  [t1, y1]: readonly [number, number],
  [t2, y2]: readonly [number, number],
  y: number,
): number {
  return t1 * (t2 / t1) ** ((y - y1) / (y2 - y1));
}

/**
 * Estimated share of full strength, minutes after the pour, by the coldest component. Never a design value. Linear from zero to the
 * first point, on a logarithmic time axis from there, level after the last; cold slows the clock as it lengthens the waits.
 */
export function strengthShare({
  minutes,
  product,
  tempF,
}: {
  readonly minutes: number;
  readonly product: Product;
  readonly tempF: number;
}): number {
  const t = minutes / temperatureFactor(product, tempF);
  const points = [...product.strength].sort((a, b) => a.minutes - b.minutes);
  let before = points[0];
  if (before === undefined || !(t > 0)) return 0;
  if (t <= before.minutes) return (before.share * t) / before.minutes;
  for (const point of points) {
    if (t <= point.minutes)
      return logInterpolate([before.minutes, before.share], [point.minutes, point.share], t);
    before = point;
  }
  return before.share;
}

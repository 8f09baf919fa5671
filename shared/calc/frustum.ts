/** Volume of a frustum of a circular cone of height h and end diameters, all in one unit: πh/12·(D₁² + D₁D₂ + D₂²). */
export function frustumVolume(h: number, d1: number, d2: number): number {
  return ((Math.PI * h) / 12) * (d1 * d1 + d1 * d2 + d2 * d2);
}

/** Volume of a frustum by its end girths, all in one unit: h/(12π)·(C₁² + C₁C₂ + C₂²). */
export function frustumVolumeByGirths(h: number, c1: number, c2: number): number {
  return (h / (12 * Math.PI)) * (c1 * c1 + c1 * c2 + c2 * c2);
}

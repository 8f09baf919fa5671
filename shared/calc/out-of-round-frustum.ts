/** Two axes at right angles, the full widths. */
export type Axes = { readonly a: number; readonly b: number };

/** Volume of an out-of-round frustum whose axes run straight from top to bottom, all in one unit: πh/24·(2a₁b₁ + a₁b₂ + a₂b₁ + 2a₂b₂). A frustum of √(ab) would not be exact. */
export function outOfRoundFrustumVolume(h: number, top: Axes, bottom: Axes): number {
  return (
    ((Math.PI * h) / 24) * (2 * top.a * top.b + top.a * bottom.b + bottom.a * top.b + 2 * bottom.a * bottom.b)
  );
}

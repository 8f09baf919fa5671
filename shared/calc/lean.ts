/** A lean or a rake: inches per 10 ft, and the direction in degrees from north towards which the top leans. */
export type Lean = { readonly inPer10Ft: number; readonly azimuthDeg: number | null };

/** Up to this amount a lean may lack its direction. */
export const DIRECTIONLESS_IN_PER_10FT = 0.25;

/** No longer than this an amount counts as zero, whose direction does not matter. */
const NONE = 1e-12;

function vector(lean: Lean, azimuthDeg: number): readonly [north: number, east: number] {
  const angle = (azimuthDeg * Math.PI) / 180;
  return [lean.inPer10Ft * Math.cos(angle), lean.inPer10Ft * Math.sin(angle)];
}

/**
 * |lean − rake| as vectors, inches per 10 ft. An amount of 0.25 or less without a direction counts as taken against the other vector, the
 * worst case; a larger one without a direction gives null.
 */
export function leanDeviation(lean: Lean, rake: Lean): number | null {
  for (const side of [lean, rake]) {
    if (!Number.isFinite(side.inPer10Ft) || side.inPer10Ft < 0) return null;
    if (side.azimuthDeg === null && side.inPer10Ft > DIRECTIONLESS_IN_PER_10FT + 1e-9) return null;
  }
  if (lean.inPer10Ft <= NONE || rake.inPer10Ft <= NONE) return lean.inPer10Ft + rake.inPer10Ft;
  if (lean.azimuthDeg === null || rake.azimuthDeg === null) return lean.inPer10Ft + rake.inPer10Ft;
  const [north, east] = vector(lean, lean.azimuthDeg);
  const [rakeNorth, rakeEast] = vector(rake, rake.azimuthDeg);
  return Math.hypot(north - rakeNorth, east - rakeEast);
}

/** Change of lean |before − after| as vectors, by the same rule. */
export function leanChange(before: Lean, after: Lean): number | null {
  return leanDeviation(before, after);
}

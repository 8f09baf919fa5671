type Position = { readonly latitude: number | null; readonly longitude: number | null };

/** Mean radius of the Earth (IUGG, 6,371,008.8 m) in feet of 0.3048 m. */
const RADIUS_FT = 6_371_008.8 / 0.3048;
const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** Feet between two positions on a sphere, to be looked at (within 0.6 % of the geodesic); null when one is not known. */
export function distanceFt(from: Position, to: Position): number | null {
  if (from.latitude === null || from.longitude === null || to.latitude === null || to.longitude === null)
    return null;
  const dLat = radians(to.latitude - from.latitude) / 2;
  const dLon = radians(to.longitude - from.longitude) / 2;
  const h =
    Math.sin(dLat) ** 2 +
    Math.cos(radians(from.latitude)) * Math.cos(radians(to.latitude)) * Math.sin(dLon) ** 2;
  return 2 * RADIUS_FT * Math.asin(Math.min(1, Math.sqrt(h)));
}

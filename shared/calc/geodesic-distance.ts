/** A place on the WGS 84 ellipsoid, degrees. */
export type Place = { readonly latitude: number; readonly longitude: number };

/** WGS 84: equatorial radius in metres and flattening (NIMA TR8350.2). */
const A = 6_378_137;
const F = 1 / 298.257223563;
const B = A * (1 - F);
const SECOND_ECCENTRICITY_SQUARED = (A * A - B * B) / (B * B);

const ROUNDS = 200;
const CLOSE = 1e-13;
const rad = (degrees: number): number => (degrees * Math.PI) / 180;
/** Difference of two longitudes, −180 to 180°: exact for near places on either side of the antimeridian too. */
const longitudeFrom = (a: number, b: number): number => {
  const difference = (b - a) % 360;
  if (difference > 180) return difference - 360;
  return difference < -180 ? difference + 360 : difference;
};

type Arc = {
  readonly sigma: number;
  readonly sinSigma: number;
  readonly cosSigma: number;
  readonly cosSquaredAlpha: number;
  /** cos of twice the angle from the equator to the middle of the arc. */
  readonly cos2m: number;
};

/** The arc on the auxiliary sphere for reduced latitudes and a difference of longitude on that sphere; null for one point. */
const arcOf = (
  [sinU1, cosU1, sinU2, cosU2]: Reduced,
  lambda: number,
): (Arc & { sinAlpha: number }) | null => {
  const sinLambda = Math.sin(lambda);
  const cosLambda = Math.cos(lambda);
  const sinSigma = Math.hypot(cosU2 * sinLambda, cosU1 * sinU2 - sinU1 * cosU2 * cosLambda);
  if (sinSigma === 0) return null;
  const cosSigma = sinU1 * sinU2 + cosU1 * cosU2 * cosLambda;
  const sinAlpha = (cosU1 * cosU2 * sinLambda) / sinSigma;
  const cosSquaredAlpha = 1 - sinAlpha * sinAlpha;
  // Along the equator the middle of the arc has no angle from it.
  const cos2m = cosSquaredAlpha > 1e-15 ? cosSigma - (2 * sinU1 * sinU2) / cosSquaredAlpha : 0;
  return { sigma: Math.atan2(sinSigma, cosSigma), sinSigma, cosSigma, cosSquaredAlpha, cos2m, sinAlpha };
};
type Reduced = readonly [sinU1: number, cosU1: number, sinU2: number, cosU2: number];

const lengthOf = ({ sigma, sinSigma, cosSigma, cosSquaredAlpha, cos2m }: Arc): number => {
  const u2 = cosSquaredAlpha * SECOND_ECCENTRICITY_SQUARED;
  const a = 1 + (u2 / 16384) * (4096 + u2 * (-768 + u2 * (320 - 175 * u2)));
  const b = (u2 / 1024) * (256 + u2 * (-128 + u2 * (74 - 47 * u2)));
  const cube = (b / 6) * cos2m * (-3 + 4 * sinSigma ** 2) * (-3 + 4 * cos2m ** 2);
  const deltaSigma = b * sinSigma * (cos2m + (b / 4) * (cosSigma * (-1 + 2 * cos2m ** 2) - cube));
  return B * a * (sigma - deltaSigma);
};

/**
 * Length of the geodesic between two places, metres, by Vincenty's inverse solution (Survey Review XXIII, 176, 1975).
 * Within a millimetre, but for places nearly opposite each other on the globe, where the iteration does not settle: null.
 * Null too for what is no place.
 */
export function geodesicDistanceM(from: Place, to: Place): number | null {
  const degrees = [from.latitude, from.longitude, to.latitude, to.longitude];
  if (!degrees.every(Number.isFinite) || Math.abs(from.latitude) > 90 || Math.abs(to.latitude) > 90)
    return null;
  const l = rad(longitudeFrom(from.longitude, to.longitude));
  const u1 = Math.atan((1 - F) * Math.tan(rad(from.latitude)));
  const u2 = Math.atan((1 - F) * Math.tan(rad(to.latitude)));
  const reduced: Reduced = [Math.sin(u1), Math.cos(u1), Math.sin(u2), Math.cos(u2)];
  let lambda = l;
  for (let round = 0; round < ROUNDS; round += 1) {
    const arc = arcOf(reduced, lambda);
    if (arc === null) return 0;
    const { sigma, sinSigma, cosSigma, cosSquaredAlpha, cos2m, sinAlpha } = arc;
    const c = (F / 16) * cosSquaredAlpha * (4 + F * (4 - 3 * cosSquaredAlpha));
    const turn = cos2m + c * cosSigma * (-1 + 2 * cos2m * cos2m);
    const next = l + (1 - c) * F * sinAlpha * (sigma + c * sinSigma * turn);
    if (Math.abs(next) > Math.PI) return null;
    if (Math.abs(next - lambda) < CLOSE) {
      const settled = arcOf(reduced, next);
      return settled === null ? 0 : lengthOf(settled);
    }
    lambda = next;
  }
  return null;
}

import { outOfRoundFrustumVolume } from './out-of-round-frustum.ts';
import { areaFactor, type Section } from './section.ts';

/** The pole below grade: sizes in inches running straight from ground line (depth 0) to butt, depths in ft. */
export type PoleProfile = {
  readonly section: Section;
  readonly embedmentFt: number;
  readonly groundLineIn: number;
  readonly buttIn: number;
  /** Wall of a pole whose butt is open, so that its inside counts as void; null where the pole counts as solid. */
  readonly openWallIn: number | null;
};

/** Size at a depth, inches; the ground line's above it, the butt's below. */
export function poleSizeAt(pole: PoleProfile, z: number): number {
  const share = pole.embedmentFt > 0 ? Math.min(Math.max(z / pole.embedmentFt, 0), 1) : 0;
  return pole.groundLineIn + (pole.buttIn - pole.groundLineIn) * share;
}

/** Volume of a regular solid whose size runs straight from s₁ to s₂: the cone's formula by the section's own area. */
function taperedVolume(factor: number, h: number, s1: number, s2: number): number {
  const round = outOfRoundFrustumVolume(h, { a: s1, b: s1 }, { a: s2, b: s2 });
  return (round * factor) / (Math.PI / 4);
}

/** What the pole takes up between two depths, ft³: its whole section, or its wall alone where the butt is open. 0 below the butt; additive when cut. */
export function poleVolume(pole: PoleProfile, fromFt: number, toFt: number): number {
  const from = Math.max(0, fromFt);
  const to = Math.min(pole.embedmentFt, toFt);
  if (!(to > from)) return 0;
  const factor = areaFactor(pole.section);
  const s1 = poleSizeAt(pole, from);
  const s2 = poleSizeAt(pole, to);
  const outside = taperedVolume(factor, to - from, s1, s2);
  const wall = pole.openWallIn;
  if (wall === null) return outside / 144;
  return (outside - insideVolume({ factor, h: to - from, i1: s1 - 2 * wall, i2: s2 - 2 * wall })) / 144;
}

/** Inside of an open pole; where the wall meets itself there is none. */
function insideVolume({
  factor,
  h,
  i1,
  i2,
}: {
  readonly factor: number;
  readonly h: number;
  readonly i1: number;
  readonly i2: number;
}): number {
  if (i1 <= 0 && i2 <= 0) return 0;
  if (i1 >= 0 && i2 >= 0) return taperedVolume(factor, h, i1, i2);
  const open = Math.max(i1, i2);
  return taperedVolume(factor, (h * open) / Math.abs(i1 - i2), open, 0);
}

/** Area that the pole takes up at a depth, in². */
export function poleAreaAt(pole: PoleProfile, z: number): number {
  if (z > pole.embedmentFt) return 0;
  const size = poleSizeAt(pole, z);
  const inside = pole.openWallIn === null ? 0 : Math.max(0, size - 2 * pole.openWallIn);
  return areaFactor(pole.section) * (size * size - inside * inside);
}

import { boreAreaAt, boreProfile, boreVolume, type BoreProfile } from './bore-profile.ts';
import { poleAreaAt, poleVolume, type PoleProfile } from './pole-profile.ts';
import { poleSizes, type PoleSizes } from './pole-sizes.ts';
import { numberOf, positiveOf, textOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** Bore, pole and the levels between which foam stands; depths in ft below low-side grade. */
export type SetSpace = {
  readonly bore: BoreProfile;
  readonly pole: PoleProfile;
  readonly sizes: PoleSizes;
  /** Level of the foam's top; a crown above grade is not counted. */
  readonly foamTopFt: number;
  /** Bottom of the foamed space: bore depth less bed. */
  readonly foamBottomFt: number;
  readonly bedFt: number;
  readonly bedMaterial: 'none' | 'crushed-stone' | 'native';
  /** Rise of grade across the bore, inches, where the foam's top follows it; else 0. */
  readonly followedRiseIn: number;
};

type Bed = Pick<SetSpace, 'bedFt' | 'bedMaterial'>;

/** Null: a bed of unknown height or material. */
function bedOf(values: FieldValues): Bed | null {
  const material = textOf(values, 'bedMaterial') ?? 'none';
  const bedFt = numberOf(values, 'bedFt');
  if (bedFt !== null && bedFt > 0) {
    return material === 'crushed-stone' || material === 'native' ? { bedFt, bedMaterial: material } : null;
  }
  return material === 'none' || bedFt === 0 ? { bedFt: 0, bedMaterial: 'none' } : null;
}

/** Wall by which an open butt lets foam in; null where the pole counts as solid, undefined where an open pole's wall is not known. */
function openWall(values: FieldValues): number | null | undefined {
  if (textOf(values, 'buttEnd') !== 'open') return null;
  return positiveOf(values, 'wallIn') ?? undefined;
}

/** The pole below grade of a *set* record; null where a size or the embedment is not known. */
export function poleBelowGrade(values: FieldValues): { pole: PoleProfile; sizes: PoleSizes } | null {
  const sizes = poleSizes(values);
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const openWallIn = openWall(values);
  if (sizes === null || embedmentFt === null || openWallIn === undefined) return null;
  const pole = {
    section: sizes.section,
    embedmentFt,
    groundLineIn: sizes.groundLine.sizeIn,
    buttIn: sizes.butt.sizeIn,
    openWallIn,
  };
  return { pole, sizes };
}

/** Null when a value that the void needs is missing. */
export function setSpace(
  values: FieldValues,
  { foamFollowsGrade }: { readonly foamFollowsGrade: boolean },
): SetSpace | null {
  const bore = boreProfile(values);
  const below = poleBelowGrade(values);
  const bed = bedOf(values);
  const foamTopIn = numberOf(values, 'foamTopBelowGradeIn');
  if (bore === null || below === null || bed === null || foamTopIn === null) return null;
  const foamBottomFt = Math.max(0, bore.depthFt - bed.bedFt);
  return {
    bore,
    ...below,
    ...bed,
    foamTopFt: Math.min(Math.max(0, foamTopIn / 12), foamBottomFt),
    foamBottomFt,
    followedRiseIn: foamFollowsGrade ? Math.max(0, numberOf(values, 'slopeRiseIn') ?? 0) : 0,
  };
}

/** Space between bore and pole between two depths, ft³, before the slope; the pole counts down to its butt or to the deeper depth, whichever is higher. */
export function spaceBetween(space: SetSpace, fromFt: number, toFt: number): number {
  return boreVolume(space.bore, fromFt, toFt) - poleVolume(space.pole, fromFt, toFt);
}

/** The void to be foamed, ft³: ∫(bore area − pole area) dz over the foamed space, and the wedge over the low side where the foam's top follows grade. Never negative. */
export function setVoid(space: SetSpace): number {
  const top = space.foamTopFt;
  const areaFt2 = (boreAreaAt(space.bore, top) - poleAreaAt(space.pole, top)) / 144;
  const volume = spaceBetween(space, top, space.foamBottomFt) + (areaFt2 * space.followedRiseIn) / 24;
  return Math.max(0, volume);
}

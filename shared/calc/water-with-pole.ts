import { bisect } from './bisect.ts';
import { boreVolume, type BoreProfile } from './bore-profile.ts';
import { poleVolume, type PoleProfile } from './pole-profile.ts';
import { setSpace } from './set-space.ts';
import { numberOf, textOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type WaterBed = {
  readonly bedFt: number;
  /** Share of the bed open to water. */ readonly porosity: number;
};

/**
 * Depth of water from the bore's bottom with bed and pole in it, inches, of water measured in the open bore: the height at which what is
 * left of bore, less pole, less the bed's stone, holds the same volume. Cannot pass grade. An open pole lets water in.
 */
export function waterWithPole({
  bore,
  pole,
  bed,
  openIn,
}: {
  readonly bore: BoreProfile;
  readonly pole: PoleProfile;
  readonly bed: WaterBed;
  readonly openIn: number;
}): number {
  if (!(openIn > 0)) return 0;
  const depth = bore.depthFt;
  const levelOf = (heightFt: number) => depth - heightFt;
  const water = boreVolume(bore, levelOf(Math.min(openIn / 12, depth)), depth);
  const room = (heightFt: number) => {
    const level = levelOf(heightFt);
    const bedTop = Math.max(level, levelOf(bed.bedFt));
    const inBed = boreVolume(bore, bedTop, depth) - poleVolume(pole, bedTop, depth);
    const above = boreVolume(bore, level, bedTop) - poleVolume(pole, level, bedTop);
    return inBed * bed.porosity + above;
  };
  return bisect(room, water, [0, depth]) * 12;
}

/** A record's water with the structure in, inches; null when not measured or a needed value is missing. */
export function waterWithPoleOf(values: FieldValues, bedPorosity: number): number | null {
  const openIn = numberOf(values, 'waterIn');
  if (openIn === null) return null;
  if (textOf(values, 'waterMeasured') === 'with-pole' || openIn <= 0) return Math.max(0, openIn);
  // Water stands below the foam, so the foam's level does not matter.
  const space = setSpace({ ...values, foamTopBelowGradeIn: 0 }, { foamFollowsGrade: false });
  if (space === null) return null;
  const porosity = space.bedMaterial === 'crushed-stone' ? bedPorosity : 0;
  return waterWithPole({
    bore: space.bore,
    pole: space.pole,
    bed: { bedFt: Math.min(space.bedFt, space.bore.depthFt), porosity },
    openIn,
  });
}

import { boreProfile } from './bore-profile.ts';
import { poleSizes } from './pole-sizes.ts';
import { acrossCorners } from './section.ts';
import { numberOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** Least gap between bore and pole, inches: as measured, else (least bore − greatest pole)/2, the bell left out, a polygon to its corners. Negative where the pole is wider than the bore. */
export function leastAnnulusIn(values: FieldValues): number | null {
  const measured = numberOf(values, 'leastGapIn');
  if (measured !== null) return measured;
  const bore = boreProfile(values);
  const sizes = poleSizes(values);
  if (bore === null || sizes === null) return null;
  const pole = acrossCorners(sizes.section, Math.max(sizes.groundLine.sizeIn, sizes.butt.sizeIn));
  return (bore.leastIn - pole) / 2;
}

/** Greatest gap, inches: (greatest bore − least pole across flats)/2, the bell left out. */
export function greatestAnnulusIn(values: FieldValues): number | null {
  const bore = boreProfile(values);
  const sizes = poleSizes(values);
  if (bore === null || sizes === null) return null;
  return (bore.greatestIn - Math.min(sizes.groundLine.sizeIn, sizes.butt.sizeIn)) / 2;
}

import type { Place } from '#shared/calc/geodesic-distance.ts';
import { numberOf } from '#shared/calc/values.ts';
import type { LineView } from './types.ts';

export type StatedPlace = { readonly place: Place; readonly accuracyFt: number };

/** Where a line says that it stands, and how well that is known (0 if blank); null when any of it is missing or unreadable. */
export const statedPlace = ({ values, broken }: LineView): StatedPlace | null => {
  const latitude = numberOf(values, 'latitude');
  const longitude = numberOf(values, 'longitude');
  if (latitude === null || longitude === null || broken.has('accuracyFt')) return null;
  return { place: { latitude, longitude }, accuracyFt: numberOf(values, 'accuracyFt') ?? 0 };
};

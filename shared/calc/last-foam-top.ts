import { numberOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** The record with the foam's top as its last event left it; as-found values stay where no event says. Events in order. */
export function lastFoamTop(values: FieldValues, events: readonly FieldValues[]): FieldValues {
  const levels = events
    .map((event) => numberOf(event, 'foamTopBelowGradeIn'))
    .filter((level) => level !== null);
  const last = levels.at(-1);
  return last === undefined ? values : { ...values, foamTopBelowGradeIn: last };
}

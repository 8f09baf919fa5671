import { gapsOf, planeDepartureIn, type Gaps } from '#shared/calc/relevel-void.ts';
import { numberOf, positiveOf } from '#shared/calc/values.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type RelevelSection = {
  /** Length runs from front to back, width from left to right. */
  readonly lengthIn: number | null;
  readonly widthIn: number | null;
  readonly opening: { readonly lengthIn: number; readonly widthIn: number } | null;
  /** Front left, back left, back right, front right. */
  readonly gapsIn: Gaps | null;
  readonly planeIn: number | null;
  readonly slopeBeforeAcross: number | null;
  readonly slopeAfterAcross: number | null;
  readonly slopeAfterAlong: number | null;
  readonly missing: readonly string[];
};

/** What a *re-level* record looks like in plan and section, as numbers alone. */
export function relevelSection(values: FieldValues): RelevelSection {
  const gapsIn = gapsOf(values);
  const openingLengthIn = positiveOf(values, 'openingLengthIn');
  const openingWidthIn = positiveOf(values, 'openingWidthIn');
  return {
    lengthIn: positiveOf(values, 'padLengthIn'),
    widthIn: positiveOf(values, 'padWidthIn'),
    opening:
      openingLengthIn !== null && openingWidthIn !== null
        ? { lengthIn: openingLengthIn, widthIn: openingWidthIn }
        : null,
    gapsIn,
    planeIn: gapsIn && planeDepartureIn(gapsIn),
    slopeBeforeAcross: numberOf(values, 'slopeBeforeAcrossInPerFt'),
    slopeAfterAcross: numberOf(values, 'slopeAfterAcrossInPerFt'),
    slopeAfterAlong: numberOf(values, 'slopeAfterAlongInPerFt'),
    missing: ['padLengthIn', 'padWidthIn', 'gap1In', 'gap2In', 'gap3In', 'gap4In'].filter(
      (field) => numberOf(values, field) === null,
    ),
  };
}

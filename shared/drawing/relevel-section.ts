import { gapsOf, GAP_FIELDS, planeDepartureIn, type Gaps } from '#shared/calc/relevel-void.ts';
import { numberOf, positiveOf } from '#shared/calc/values.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type RelevelSection = {
  /** Length runs from front to back, width from left to right. */
  readonly lengthIn: number | null;
  readonly widthIn: number | null;
  readonly opening: { readonly lengthIn: number; readonly widthIn: number } | null;
  /** Front left, back left, back right, front right; null where one is missing. */
  readonly gapsIn: Gaps | null;
  /** Each as it was measured, in the same order. */
  readonly cornersIn: readonly (number | null)[];
  readonly planeIn: number | null;
  readonly slopes: {
    readonly beforeAcross: number | null;
    readonly beforeAlong: number | null;
    readonly afterAcross: number | null;
    readonly afterAlong: number | null;
  };
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
    cornersIn: GAP_FIELDS.map((field) => numberOf(values, field)),
    planeIn: gapsIn && planeDepartureIn(gapsIn),
    slopes: {
      beforeAcross: numberOf(values, 'slopeBeforeAcrossInPerFt'),
      beforeAlong: numberOf(values, 'slopeBeforeAlongInPerFt'),
      afterAcross: numberOf(values, 'slopeAfterAcrossInPerFt'),
      afterAlong: numberOf(values, 'slopeAfterAlongInPerFt'),
    },
    missing: ['padLengthIn', 'padWidthIn', ...GAP_FIELDS].filter((field) => numberOf(values, field) === null),
  };
}

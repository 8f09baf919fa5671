import { bisect } from './bisect.ts';
import type { BorePart } from './bore-profile.ts';
import type { Section } from './section.ts';
import { setSpace, spaceBetween } from './set-space.ts';
import { numberOf } from './values.ts';
import { waterWithPoleOf } from './water-with-pole.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** What the drawing of a *set* record needs; depths in ft below low-side grade, sizes in inches. */
export type SetGeometry = {
  readonly bore: {
    readonly depthFt: number;
    readonly parts: readonly BorePart[];
    readonly leastIn: number;
    readonly greatestIn: number;
  };
  readonly pole: {
    readonly section: Section;
    readonly embedmentFt: number;
    readonly groundLineIn: number;
    readonly buttIn: number;
    readonly taped: boolean;
    /** Wall of a pole open at the butt; null where it counts as solid. */
    readonly openWallIn: number | null;
  };
  readonly bed: { readonly topFt: number; readonly bottomFt: number; readonly material: string } | null;
  /** Foam's top as recorded; negative where crowned above grade. */
  readonly foamTopFt: number;
  readonly foamBottomFt: number;
  /** Level that the placed volume reaches; 0 where it would pass grade. Null where it is not known. */
  readonly placedTopFt: number | null;
  /** Levels of the water, in the open bore as measured and with the structure in; null where there is none or it was not measured. */
  readonly waterOpenFt: number | null;
  readonly waterFt: number | null;
  readonly rockFromFt: number | null;
  readonly slopeRiseIn: number;
  readonly dueFt: number | null;
};

/** Null when a value that the drawing needs is missing. */
export function setGeometry(
  values: FieldValues,
  {
    placedFt3 = null,
    dueFt = null,
    bedPorosity = 0.4,
  }: {
    readonly placedFt3?: number | null;
    readonly dueFt?: number | null;
    readonly bedPorosity?: number;
  } = {},
): SetGeometry | null {
  const space = setSpace(values, { foamFollowsGrade: false });
  if (space === null) return null;
  const { bore, pole, sizes, foamBottomFt, bedFt, bedMaterial } = space;
  const level = (heightIn: number | null) =>
    heightIn === null || heightIn <= 0 ? null : Math.max(0, bore.depthFt - heightIn / 12);
  const openBore = values['waterMeasured'] !== 'with-pole';
  const filled = (heightFt: number) => spaceBetween(space, foamBottomFt - heightFt, foamBottomFt);
  return {
    bore,
    pole: { ...pole, taped: sizes.taped },
    bed: bedFt > 0 ? { topFt: foamBottomFt, bottomFt: bore.depthFt, material: bedMaterial } : null,
    foamTopFt: (numberOf(values, 'foamTopBelowGradeIn') ?? 0) / 12,
    foamBottomFt,
    placedTopFt: placedFt3 === null ? null : foamBottomFt - bisect(filled, placedFt3, [0, foamBottomFt]),
    waterOpenFt: openBore ? level(numberOf(values, 'waterIn')) : null,
    waterFt: level(waterWithPoleOf(values, bedPorosity)),
    rockFromFt: values['ground'] === 'soil-over-rock' ? numberOf(values, 'rockFromFt') : null,
    slopeRiseIn: Math.max(0, numberOf(values, 'slopeRiseIn') ?? 0),
    dueFt,
  };
}

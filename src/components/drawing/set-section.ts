import { boreAxesAt, boreProfile, type BoreProfile } from '#shared/calc/bore-profile.ts';
import { bisect } from '#shared/calc/bisect.ts';
import { poleBelowGrade, setSpace, spaceBetween, type SetSpace } from '#shared/calc/set-space.ts';
import { poleSizeAt, type PoleProfile } from '#shared/calc/pole-profile.ts';
import { numberOf, positiveOf, textOf } from '#shared/calc/values.ts';
import type { Derived, FieldValues } from '#shared/records/types.ts';

/** Feet: x from the bore's axis, z down from low-side grade. */
export type FtPoint = { readonly x: number; readonly z: number };

export type SetSection = {
  readonly bore: BoreProfile | null;
  readonly pole: PoleProfile | null;
  /** How far the pole stands off the bore's axis where a least gap was measured, ft. */
  readonly poleOffsetFt: number;
  readonly foam: {
    /** Level that the placed volume reaches; the recorded top where the volume is not known. */
    readonly topFt: number;
    readonly bottomFt: number;
    /** Recorded top, where the placed volume stays below it. */
    readonly recordedTopFt: number | null;
    /** Height of the crown above grade. */
    readonly crownFt: number;
  } | null;
  readonly waterFt: number | null;
  readonly bed: { readonly heightFt: number; readonly material: 'crushed-stone' | 'native' } | null;
  /** Depth of rock; 0: rock from grade; null: soil only, or unknown. */
  readonly rockFromFt: number | null;
  /** Rise of grade per foot across the bore; the low side is at the left. */
  readonly slope: number;
  readonly embedmentFt: number | null;
  readonly dueFt: number | null;
  /** Deepest thing on the sheet, ft. */
  readonly deepestFt: number;
  /** Field keys that the drawing lacks. */
  readonly missing: readonly string[];
};

/** What a *set* record looks like in section, as numbers alone. What was not measured is null and named in `missing`. */
export function setSection(values: FieldValues, derived: Derived): SetSection {
  const bore = boreProfile(values);
  const pole = poleBelowGrade(values)?.pole ?? null;
  const space = setSpace(values, { foamFollowsGrade: false });
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const boreDepthFt = positiveOf(values, 'boreDepthFt');
  const bedFt = positiveOf(values, 'bedFt');
  const bedMaterial = textOf(values, 'bedMaterial');
  const riseIn = numberOf(values, 'slopeRiseIn') ?? 0;
  const topFt = (positiveOf(values, 'boreTopIn') ?? 0) / 12;
  return {
    bore,
    pole,
    poleOffsetFt: offset(bore, pole, positiveOf(values, 'leastGapIn')),
    foam: foamOf(values, { space, placedFt3: derived.placedFt3 }),
    waterFt: inFeet(derived.waterWithPoleIn ?? numberOf(values, 'waterIn')),
    bed:
      bedFt !== null && (bedMaterial === 'crushed-stone' || bedMaterial === 'native')
        ? { heightFt: bedFt, material: bedMaterial }
        : null,
    rockFromFt: rockFrom(values),
    slope: topFt > 0 && riseIn > 0 ? riseIn / 12 / topFt : 0,
    embedmentFt,
    dueFt: derived.dueFt,
    deepestFt: Math.max(boreDepthFt ?? 0, embedmentFt ?? 0, derived.dueFt ?? 0, 2),
    missing: missingOf(values, { bore, pole, space }),
  };
}

function inFeet(inches: number | null): number | null {
  return inches === null ? null : inches / 12;
}

function rockFrom(values: FieldValues): number | null {
  const ground = textOf(values, 'ground');
  if (ground === 'rock') return 0;
  return ground === 'soil-over-rock' ? numberOf(values, 'rockFromFt') : null;
}

/** The measured least gap is put at the right; it never moves the pole the other way. */
function offset(bore: BoreProfile | null, pole: PoleProfile | null, leastGapIn: number | null): number {
  if (bore === null || pole === null || leastGapIn === null) return 0;
  const gapAt = (z: number) => (boreAxesAt(bore, z).a - poleSizeAt(pole, z)) / 2;
  const centred = Math.min(gapAt(0), gapAt(Math.min(pole.embedmentFt, bore.depthFt)));
  return Math.max(0, centred - leastGapIn) / 12;
}

function foamOf(
  values: FieldValues,
  { space, placedFt3 }: { space: SetSpace | null; placedFt3: number | null },
): SetSection['foam'] {
  const recordedIn = numberOf(values, 'foamTopBelowGradeIn');
  if (space === null || recordedIn === null) return null;
  const bottomFt = space.foamBottomFt;
  const crownFt = Math.max(0, -recordedIn) / 12;
  if (placedFt3 === null) {
    return { topFt: space.foamTopFt, bottomFt, recordedTopFt: null, crownFt };
  }
  const heightFt = bisect((height) => spaceBetween(space, bottomFt - height, bottomFt), placedFt3, [
    0,
    bottomFt - space.foamTopFt,
  ]);
  const topFt = bottomFt - heightFt;
  // A hundredth of a foot is less than a line's width.
  const short = topFt - space.foamTopFt > 0.01;
  return { topFt, bottomFt, recordedTopFt: short ? space.foamTopFt : null, crownFt: short ? 0 : crownFt };
}

function missingOf(
  values: FieldValues,
  drawn: { bore: BoreProfile | null; pole: PoleProfile | null; space: SetSpace | null },
): string[] {
  const missing: string[] = [];
  if (drawn.bore === null) {
    for (const field of ['boreTopIn', 'boreDepthFt']) {
      if (positiveOf(values, field) === null) missing.push(field);
    }
  }
  if (positiveOf(values, 'embedmentFt') === null) missing.push('embedmentFt');
  else if (drawn.pole === null) missing.push('girthGroundLineIn');
  if (numberOf(values, 'foamTopBelowGradeIn') === null) missing.push('foamTopBelowGradeIn');
  if (numberOf(values, 'waterIn') === null) missing.push('waterIn');
  if (textOf(values, 'ground') === 'soil-over-rock' && numberOf(values, 'rockFromFt') === null) {
    missing.push('rockFromFt');
  }
  return missing;
}

/** Half width of the bore at a depth, ft. */
export function boreHalfFt(bore: BoreProfile, z: number): number {
  return boreAxesAt(bore, z).a / 24;
}

/** Right wall of the bore between two depths, top to bottom, with every kink. */
export function boreWall(bore: BoreProfile, fromFt: number, toFt: number): FtPoint[] {
  const kinks = bore.parts.map((part) => part.toFt).filter((z) => z > fromFt && z < toFt);
  return [fromFt, ...kinks, toFt].map((z) => ({ x: boreHalfFt(bore, z), z }));
}

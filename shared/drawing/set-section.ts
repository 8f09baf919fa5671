import { bisect } from '#shared/calc/bisect.ts';
import { boreAxesAt, boreProfile, type BoreProfile } from '#shared/calc/bore-profile.ts';
import { lastFoamTop } from '#shared/calc/last-foam-top.ts';
import { poleSizeAt, type PoleProfile } from '#shared/calc/pole-profile.ts';
import { poleBelowGrade, setSpace, spaceBetween, type SetSpace } from '#shared/calc/set-space.ts';
import { numberOf, positiveOf, textOf } from '#shared/calc/values.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { liftShares } from './lift-shares.ts';
import { setGhosts, type SetGhosts } from './set-ghosts.ts';
import type { SheetPurpose, SheetRecord } from './sheet-types.ts';

/** Feet: x from the bore's axis, z down from low-side grade. */
export type FtPoint = { readonly x: number; readonly z: number };

export type SetSection = {
  readonly bore: BoreProfile | null;
  readonly pole: PoleProfile | null;
  /** Stands in, dashed, for a bore or pole that cannot be drawn from its readings. */
  readonly ghosts: SetGhosts;
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
    /** Levels where one lift ends and the next begins, from the lowest up. */
    readonly liftsFt: readonly number[];
  } | null;
  /** With the pole in. */
  readonly waterFt: number | null;
  /** As measured before the pole, where it is another. */
  readonly openWaterFt: number | null;
  readonly bed: { readonly heightFt: number; readonly material: 'crushed-stone' | 'native' } | null;
  /** Depth of rock; 0: rock from grade; null: soil only, or unknown. */
  readonly rockFromFt: number | null;
  /** Rise of grade per foot across the bore; the low side is at the left. */
  readonly slope: number;
  readonly embedmentFt: number | null;
  readonly boreDepthFt: number | null;
  readonly dueFt: number | null;
  /** Deepest thing on the sheet, ft. */
  readonly deepestFt: number;
  /** Field keys that the drawing lacks. */
  readonly missing: readonly string[];
};

/** What a *set* record looks like in section, as numbers alone. What was not measured is null and named in `missing`. */
export function setSection(
  {
    values: asFound,
    derived,
    pours = [],
    events = [],
  }: Pick<SheetRecord, 'values' | 'derived' | 'pours' | 'events'>,
  purpose: SheetPurpose = 'record',
): SetSection {
  // Fill sums all events, so the foam ends where the last of them left it.
  const values = lastFoamTop(asFound, events);
  const bore = boreProfile(values);
  const pole = poleBelowGrade(values)?.pole ?? null;
  const space = setSpace(values, { foamFollowsGrade: false });
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const boreDepthFt = positiveOf(values, 'boreDepthFt');
  const bedFt = positiveOf(values, 'bedFt');
  const bedMaterial = textOf(values, 'bedMaterial');
  const riseIn = numberOf(values, 'slopeRiseIn') ?? 0;
  const topFt = (positiveOf(values, 'boreTopIn') ?? 0) / 12;
  const ghosts = setGhosts(values, { bore, pole, dueFt: derived.dueFt });
  const waterFt = inFeet(derived.waterWithPoleIn ?? numberOf(values, 'waterIn'));
  return {
    bore,
    pole,
    ghosts,
    poleOffsetFt: offset(bore, pole, positiveOf(values, 'leastGapIn')),
    foam: foamOf(values, { space, placedFt3: derived.placedFt3, shares: liftShares(pours) }),
    waterFt,
    openWaterFt: openWater(values, waterFt),
    bed:
      bedFt !== null && (bedMaterial === 'crushed-stone' || bedMaterial === 'native')
        ? { heightFt: bedFt, material: bedMaterial }
        : null,
    rockFromFt: rockFrom(values),
    slope: topFt > 0 && riseIn > 0 ? riseIn / 12 / topFt : 0,
    embedmentFt,
    boreDepthFt,
    dueFt: derived.dueFt,
    deepestFt: Math.max(
      boreDepthFt ?? 0,
      embedmentFt ?? 0,
      derived.dueFt ?? 0,
      ghosts.bore?.depthFt ?? 0,
      ghosts.pole?.depthFt ?? 0,
      2,
    ),
    missing: missingOf(values, { bore, pole, purpose }),
  };
}

function inFeet(inches: number | null): number | null {
  return inches === null ? null : inches / 12;
}

/** Less than a twentieth of an inch apart it is the same line. */
function openWater(values: FieldValues, waterFt: number | null): number | null {
  const open = positiveOf(values, 'waterIn');
  if (open === null || textOf(values, 'waterMeasured') === 'with-pole') return null;
  return waterFt !== null && Math.abs(open / 12 - waterFt) < 0.05 / 12 ? null : open / 12;
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
  {
    space,
    placedFt3,
    shares,
  }: { space: SetSpace | null; placedFt3: number | null; shares: readonly number[] },
): SetSection['foam'] {
  const recordedIn = numberOf(values, 'foamTopBelowGradeIn');
  if (space === null || recordedIn === null) return null;
  const bottomFt = space.foamBottomFt;
  const crownFt = Math.max(0, -recordedIn) / 12;
  if (placedFt3 === null) {
    return { topFt: space.foamTopFt, bottomFt, recordedTopFt: null, crownFt, liftsFt: [] };
  }
  const levelOf = (volumeFt3: number) =>
    bottomFt -
    bisect((height) => spaceBetween(space, bottomFt - height, bottomFt), volumeFt3, [
      0,
      bottomFt - space.foamTopFt,
    ]);
  const topFt = levelOf(placedFt3);
  // A hundredth of a foot is less than a line's width.
  const short = topFt - space.foamTopFt > 0.01;
  let below = 0;
  const liftsFt = shares.slice(0, -1).map((share) => levelOf((below += share) * placedFt3));
  return {
    topFt,
    bottomFt,
    recordedTopFt: short ? space.foamTopFt : null,
    crownFt: short ? 0 : crownFt,
    liftsFt: liftsFt.filter((z) => z - topFt > 0.01),
  };
}

function missingOf(
  values: FieldValues,
  drawn: { bore: BoreProfile | null; pole: PoleProfile | null; purpose: SheetPurpose },
): string[] {
  const missing: string[] = [];
  if (drawn.bore === null) {
    for (const field of ['boreTopIn', 'boreDepthFt']) {
      if (positiveOf(values, field) === null) missing.push(field);
    }
  }
  if (positiveOf(values, 'embedmentFt') === null) missing.push('embedmentFt');
  else if (drawn.pole === null) missing.push('girthGroundLineIn');
  if (drawn.purpose === 'record') {
    if (numberOf(values, 'foamTopBelowGradeIn') === null) missing.push('foamTopBelowGradeIn');
    if (numberOf(values, 'waterIn') === null) missing.push('waterIn');
  }
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

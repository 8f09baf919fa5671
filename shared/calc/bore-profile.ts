import { outOfRoundFrustumVolume, type Axes } from './out-of-round-frustum.ts';
import { positiveOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** A part of the bore whose axes run straight. Depths in ft below low-side grade, axes in inches. */
export type BorePart = {
  readonly fromFt: number;
  readonly toFt: number;
  readonly top: Axes;
  readonly bottom: Axes;
};

export type BoreProfile = {
  readonly depthFt: number;
  readonly parts: readonly BorePart[];
  /** Least and greatest diameter, the bell left out, inches. */
  readonly leastIn: number;
  readonly greatestIn: number;
};

/** The bore from its readings; null without a top diameter or a depth. Blank bottom across: as the bottom if that is given, else as the top across. */
export function boreProfile(values: FieldValues): BoreProfile | null {
  const depthFt = positiveOf(values, 'boreDepthFt');
  const topIn = positiveOf(values, 'boreTopIn');
  if (depthFt === null || topIn === null) return null;
  const topAcrossIn = positiveOf(values, 'boreTopAcrossIn') ?? topIn;
  const bottomIn = positiveOf(values, 'boreBottomIn');
  const bottomAcrossIn = positiveOf(values, 'boreBottomAcrossIn') ?? bottomIn ?? topAcrossIn;
  const top = { a: topIn, b: topAcrossIn };
  const bottom = { a: bottomIn ?? topIn, b: bottomAcrossIn };

  const bellIn = positiveOf(values, 'bellIn');
  const bellHeightFt = positiveOf(values, 'bellHeightFt');
  const belled = bellIn !== null && bellHeightFt !== null;
  // A bell said to be taller than the bore is no more than the bore.
  const shaftFt = belled ? Math.max(0, depthFt - bellHeightFt) : depthFt;
  const parts: BorePart[] = [{ fromFt: 0, toFt: shaftFt, top, bottom }];
  if (belled) parts.push({ fromFt: shaftFt, toFt: depthFt, top: bottom, bottom: { a: bellIn, b: bellIn } });
  const diameters = [top.a, top.b, bottom.a, bottom.b];
  return { depthFt, parts, leastIn: Math.min(...diameters), greatestIn: Math.max(...diameters) };
}

const between = (from: number, to: number, share: number) => from + (to - from) * share;

/** Of a part that has a height. */
function axesIn(part: BorePart, z: number): Axes {
  const share = (z - part.fromFt) / (part.toFt - part.fromFt);
  return { a: between(part.top.a, part.bottom.a, share), b: between(part.top.b, part.bottom.b, share) };
}

/** Axes of the bore at a depth, inches; at its ends beyond them. */
export function boreAxesAt(bore: BoreProfile, z: number): Axes {
  const within = Math.min(Math.max(z, 0), bore.depthFt);
  const part = bore.parts.find(({ fromFt, toFt }) => within <= toFt && toFt > fromFt) ?? bore.parts.at(-1);
  return part === undefined ? { a: 0, b: 0 } : axesIn(part, within);
}

/** Area of the bore at a depth, in². */
export function boreAreaAt(bore: BoreProfile, z: number): number {
  const { a, b } = boreAxesAt(bore, z);
  return (Math.PI / 4) * a * b;
}

/** Volume of the bore between two depths, ft³. Closed form; additive when cut at any depth; 0 outside the bore. */
export function boreVolume(bore: BoreProfile, fromFt: number, toFt: number): number {
  let volume = 0;
  for (const part of bore.parts) {
    const from = Math.max(fromFt, part.fromFt);
    const to = Math.min(toFt, part.toFt);
    if (to > from) volume += outOfRoundFrustumVolume(to - from, axesIn(part, from), axesIn(part, to)) / 144;
  }
  return volume;
}

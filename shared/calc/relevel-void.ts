import { numberOf, positiveOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type Gaps = readonly [number, number, number, number];

/** What lies under a raised pad: sizes and gaps in inches, the gaps at the final level. */
export type PadWedge = {
  readonly lengthIn: number;
  readonly widthIn: number;
  readonly openingLengthIn: number;
  readonly openingWidthIn: number;
  readonly gapsIn: Gaps;
};

export const GAP_FIELDS = ['gap1In', 'gap2In', 'gap3In', 'gap4In'] as const;

/** V = (L·W − l·w)·mean gap, ft³; the cable opening is taken at the mean gap. */
export function padVoid({ lengthIn, widthIn, openingLengthIn, openingWidthIn, gapsIn }: PadWedge): number {
  const [g1, g2, g3, g4] = gapsIn;
  const area = lengthIn * widthIn - openingLengthIn * openingWidthIn;
  return Math.max(0, (area * (g1 + g2 + g3 + g4)) / 4 / 1728);
}

/** How far four gaps are from those of a flat pad: |g₁ + g₃ − g₂ − g₄|/2, inches. */
export function planeDepartureIn([g1, g2, g3, g4]: Gaps): number {
  return Math.abs(g1 + g3 - g2 - g4) / 2;
}

/** The four gaps of a *re-level* record; null where one is missing. */
export function gapsOf(values: FieldValues): Gaps | null {
  const [g1, g2, g3, g4] = GAP_FIELDS.map((field) => numberOf(values, field));
  if (g1 === null || g2 === null || g3 === null || g4 === null) return null;
  if (g1 === undefined || g2 === undefined || g3 === undefined || g4 === undefined) return null;
  return [g1, g2, g3, g4];
}

/** The space under the pad of a *re-level* record; null when a value that it needs is missing. */
export function padWedgeOf(values: FieldValues): PadWedge | null {
  const lengthIn = positiveOf(values, 'padLengthIn');
  const widthIn = positiveOf(values, 'padWidthIn');
  const gapsIn = gapsOf(values);
  if (lengthIn === null || widthIn === null || gapsIn === null) return null;
  return {
    lengthIn,
    widthIn,
    openingLengthIn: Math.max(0, numberOf(values, 'openingLengthIn') ?? 0),
    openingWidthIn: Math.max(0, numberOf(values, 'openingWidthIn') ?? 0),
    gapsIn,
  };
}

import {
  GAP_FIELDS,
  padVoid,
  padWedgeOf,
  planeDepartureIn,
  type Gaps,
  type PadWedge,
} from '#shared/calc/relevel-void.ts';
import type { Scalar } from '#shared/records/types.ts';
import { assumptionsOf } from './assumptions.ts';
import type { Plan, PlanContext, VoidRange } from './plan-types.ts';
import { rangeKits } from './range-kits.ts';
import type { PlanFault, PlanReading } from './read-plan.ts';
import { sayIn, type SayOptions } from './say-plan.ts';
import { foamNotes } from './set-notes.ts';
import { rangeOf } from './void-range.ts';

const PAD = ['padLengthIn', 'padWidthIn', 'openingLengthIn', 'openingWidthIn'] as const;

/**
 * Gaps that will open under the corners when a pad is brought level at its highest corner and lifted by so much more, inches:
 * 1 front left, 2 back left, 3 back right, 4 front right. Slopes in inches per ft, higher at the back and at the right.
 */
export function expectedGaps(pad: {
  readonly lengthIn: number;
  readonly widthIn: number;
  readonly alongInPerFt: number;
  readonly acrossInPerFt: number;
  readonly liftIn: number;
}): Gaps {
  const along = (pad.alongInPerFt * pad.lengthIn) / 12;
  const across = (pad.acrossInPerFt * pad.widthIn) / 12;
  const heights = [0, along, along + across, across] as const;
  const top = Math.max(...heights);
  const gap = (height: number) => top - height + pad.liftIn;
  return [gap(heights[0]), gap(heights[1]), gap(heights[2]), gap(heights[3])];
}

function padRange(pad: PadWedge, tolerance: number): VoidRange | null {
  const shifted = (by: number) => {
    const [g1, g2, g3, g4] = pad.gapsIn;
    const to = (gap: number) => Math.max(0, gap + by);
    return padVoid({ ...pad, gapsIn: [to(g1), to(g2), to(g3), to(g4)] });
  };
  return rangeOf(padVoid(pad), [shifted(-tolerance), shifted(tolerance)]);
}

/** The plan of a settled pad: its four gaps as measured at the final level, or as its slopes foretell them. Total, as `planSet`. */
export function planRelevel(reading: PlanReading, context: PlanContext, options: SayOptions = {}): Plan {
  const { numbers } = reading;
  const assumptions = assumptionsOf(reading, context);
  const values: Record<string, Scalar> = {};
  for (const key of [...PAD, ...GAP_FIELDS]) {
    const value = numbers.get(key);
    if (value !== undefined) values[key] = value;
  }
  const measured = GAP_FIELDS.filter((key) => numbers.has(key));
  const alongInPerFt = numbers.get('slopeAlongInPerFt');
  const acrossInPerFt = numbers.get('slopeAcrossInPerFt');
  const lengthIn = numbers.get('padLengthIn');
  const widthIn = numbers.get('padWidthIn');
  if (alongInPerFt !== undefined) values['slopeBeforeAlongInPerFt'] = alongInPerFt;
  if (acrossInPerFt !== undefined) values['slopeBeforeAcrossInPerFt'] = acrossInPerFt;
  const sloped = alongInPerFt !== undefined || acrossInPerFt !== undefined || numbers.has('liftIn');
  const expected = measured.length === 0 && sloped && lengthIn !== undefined && widthIn !== undefined;
  if (expected) {
    const gaps = expectedGaps({
      lengthIn,
      widthIn,
      alongInPerFt: alongInPerFt ?? 0,
      acrossInPerFt: acrossInPerFt ?? 0,
      liftIn: numbers.get('liftIn') ?? 0,
    });
    GAP_FIELDS.forEach((key, at) => void (values[key] = gaps[at] ?? 0));
  }
  const pad = padWedgeOf(values);
  const tooWide =
    pad !== null && (pad.openingLengthIn > pad.lengthIn || pad.openingWidthIn > pad.widthIn)
      ? [{ field: 'openingLengthIn', text: 'The cable opening is larger than the pad.' }]
      : [];
  const voidFt3 = pad === null || tooWide.length > 0 ? null : padRange(pad, assumptions.tolGapIn);
  const plane = pad === null ? 0 : planeDepartureIn(pad.gapsIn);
  const rule = context.standard.rules['gap-plane'];
  return {
    kind: 'relevel',
    values,
    assumptions,
    dueFt: null,
    depthFt: null,
    boreIn: null,
    leastAnnulusIn: null,
    greatestAnnulusIn: null,
    poleTaped: null,
    voidFt3,
    kits: rangeKits(voidFt3, assumptions, context),
    waterWithPoleIn: null,
    faults: [...reading.faults, ...padFaults(reading, { sloped, measured: measured.length }), ...tooWide],
    notes: [
      ...(expected
        ? [
            {
              tone: 'note' as const,
              text: 'The gaps are expected from the slopes, the pad brought level at its highest corner. Measure them at the final level.',
            },
          ]
        : []),
      ...(rule.on && plane > rule.params.limitIn + 1e-9
        ? [
            {
              tone: 'query' as const,
              text: `These gaps are ${sayIn(plane, options)} from those of a flat pad; over ${sayIn(rule.params.limitIn, options)} the inspector will ask. Measure them again.`,
            },
          ]
        : []),
      ...foamNotes(assumptions, context, options),
    ],
  };
}

function padFaults(
  reading: PlanReading,
  { sloped, measured }: { readonly sloped: boolean; readonly measured: number },
): PlanFault[] {
  const unread = new Set(reading.faults.map(({ field }) => field));
  const blank = (key: string) => !reading.numbers.has(key) && !unread.has(key);
  const faults: PlanFault[] = [];
  if (blank('padLengthIn'))
    faults.push({ field: 'padLengthIn', text: 'Give the length of the pad, front to back.' });
  if (blank('padWidthIn'))
    faults.push({ field: 'padWidthIn', text: 'Give the width of the pad, left to right.' });
  if (measured > 0)
    for (const key of GAP_FIELDS)
      if (blank(key)) faults.push({ field: key, text: 'Give all four gaps, or none and the slopes.' });
  if (measured === 0 && !sloped && !unread.has('slopeAlongInPerFt'))
    faults.push({
      field: 'slopeAlongInPerFt',
      text: 'Give the slopes of the pad now, or its four gaps at the final level.',
    });
  return faults;
}

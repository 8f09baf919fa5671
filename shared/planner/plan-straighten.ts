import { dueColumns } from '#shared/calc/due-depth.ts';
import { sectionOf } from '#shared/calc/pole-sizes.ts';
import { wedgeOf, wedgeVoid, type Wedge } from '#shared/calc/straighten-void.ts';
import { positiveOf } from '#shared/calc/values.ts';
import type { FieldValues, Scalar } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';
import { assumptionsOf, type Assumptions } from './assumptions.ts';
import type { Plan, PlanContext, VoidRange } from './plan-types.ts';
import { rangeKits } from './range-kits.ts';
import type { PlanFault, PlanReading } from './read-plan.ts';
import { sayFt, sayIn, type SayOptions } from './say-plan.ts';
import { foamNotes } from './set-notes.ts';
import { poleValues } from './set-plan-values.ts';
import { rangeOf } from './void-range.ts';
import { waterLimitIn } from './water-answer.ts';

const COPIED = ['gapAtGradeIn', 'gapAtDepthIn', 'gapWidthIn'] as const;

/** Share of the embedment that is foamed at the least, by the owner's standard; half where that rule is off (*common practice*). */
const leastShare = ({ rules }: Standard): number => rules['gap-shallow'].params.leastShare;

/** The gap that a change of lean opens at grade, inches: change in inches per 10 ft × depth of the gap / 10 ft. */
export const expectedGapIn = (changeInPer10Ft: number, gapDepthFt: number): number =>
  (changeInPer10Ft * gapDepthFt) / 10;

/** Void over every corner of gaps, width and depth. */
function wedgeRange(
  wedge: Wedge,
  { gaps, assumptions }: { readonly gaps: number; readonly assumptions: Assumptions },
): VoidRange | null {
  const width =
    wedge.widthFrom === 'table'
      ? [0, assumptions.tolPoleTableIn]
      : [-assumptions.tolPoleTapedIn, assumptions.tolPoleTapedIn];
  const corners = [-gaps, gaps].flatMap((gap) =>
    width.flatMap((wide) =>
      [-assumptions.tolDepthIn, assumptions.tolDepthIn].map((deep) =>
        wedgeVoid({
          gapAtGradeIn: Math.max(0, wedge.gapAtGradeIn + gap),
          gapAtDepthIn: wedge.gapAtDepthIn === 0 ? 0 : Math.max(0, wedge.gapAtDepthIn + gap),
          widthIn: Math.max(0, wedge.widthIn + wide),
          depthFt: Math.max(0, wedge.depthFt + deep / 12),
        }),
      ),
    ),
  );
  return rangeOf(wedgeVoid(wedge), corners);
}

/** The plan of a pole to be straightened: the gap as measured, or as the change of lean will open it. Total, as `planSet`. */
export function planStraighten(reading: PlanReading, context: PlanContext, options: SayOptions = {}): Plan {
  const { numbers } = reading;
  const { standard } = context;
  const assumptions = assumptionsOf(reading, context);
  const pole = poleValues(reading);
  const lengthFt = positiveOf(pole, 'poleLengthFt');
  const usualFt = lengthFt === null ? null : dueColumns(standard.dueDepth, lengthFt).soilFt;
  const embedmentFt = numbers.get('embedmentFt') ?? usualFt;
  const gapDepthFt =
    numbers.get('gapDepthFt') ?? (embedmentFt === null ? null : embedmentFt * leastShare(standard));
  const lean = numbers.get('leanInPer10Ft') ?? null;
  const left = numbers.get('leanAfterInPer10Ft') ?? 0;
  const measured = numbers.get('gapAtGradeIn') ?? null;
  const values: Record<string, Scalar> = { ...pole };
  for (const key of COPIED) {
    const value = numbers.get(key);
    if (value !== undefined) values[key] = value;
  }
  if (embedmentFt !== null) values['embedmentFt'] = embedmentFt;
  if (gapDepthFt !== null) values['gapDepthFt'] = gapDepthFt;
  if (lean !== null) {
    // Pulled back along its lean: one direction, whichever it is.
    Object.assign(values, { leanBeforeInPer10Ft: lean, leanBeforeAzimuthDeg: 0 });
    Object.assign(values, { leanAfterInPer10Ft: left, leanAfterAzimuthDeg: 0 });
  }
  const expected = measured === null && lean !== null && gapDepthFt !== null;
  if (expected) values['gapAtGradeIn'] = expectedGapIn(Math.abs(lean - left), gapDepthFt);
  if (numbers.has('waterIn')) values['waterIn'] = numbers.get('waterIn') ?? 0;
  const wedge = wedgeOf(values, usualFt);
  const faults = [...reading.faults, ...missing({ values, lean, measured, gapDepthFt, reading })];
  const voidFt3 = wedge === null ? null : wedgeRange(wedge, { gaps: assumptions.tolGapIn, assumptions });
  const limitIn = waterLimitIn(standard);
  const waterIn = numbers.get('waterIn') ?? 0;
  return {
    kind: 'straighten',
    values,
    assumptions,
    dueFt: null,
    depthFt: gapDepthFt,
    boreIn: null,
    leastAnnulusIn: null,
    greatestAnnulusIn: null,
    poleTaped: wedge === null ? null : wedge.widthFrom !== 'table',
    voidFt3,
    kits: rangeKits(voidFt3, assumptions, context),
    waterWithPoleIn: numbers.get('waterIn') ?? null,
    faults,
    notes: [
      ...(expected
        ? [
            {
              tone: 'note' as const,
              text: `The gap at grade is expected from the change of lean: ${sayIn(expectedGapIn(Math.abs(lean - left), gapDepthFt), options)}. Measure it when the pole is plumb.`,
            },
          ]
        : []),
      ...(numbers.has('gapDepthFt') || gapDepthFt === null
        ? []
        : [
            {
              tone: 'note' as const,
              text: `The gap is taken ${sayFt(gapDepthFt, options)} deep, the least share of the embedment that the standard asks for.`,
            },
          ]),
      ...(limitIn !== null && waterIn > limitIn + 1e-9
        ? [
            {
              tone: 'nonconform' as const,
              text: `Water with the pole in is ${sayIn(waterIn, options)}; the limit is ${sayIn(limitIn, options)}. Remove it before the pour.`,
            },
          ]
        : []),
      { tone: 'note', text: 'The opposite gap below the pivot is not counted.' },
      ...foamNotes(assumptions, context, options),
    ],
  };
}

/** What a wedge lacks, beside the field that mends it. */
function missing(given: {
  readonly values: FieldValues;
  readonly lean: number | null;
  readonly measured: number | null;
  readonly gapDepthFt: number | null;
  readonly reading: PlanReading;
}): PlanFault[] {
  const unread = new Set(given.reading.faults.map(({ field }) => field));
  const faults: PlanFault[] = [];
  if (
    given.lean === null &&
    given.measured === null &&
    !unread.has('leanInPer10Ft') &&
    !unread.has('gapAtGradeIn')
  )
    faults.push({
      field: 'leanInPer10Ft',
      text: 'Give the lean of the pole, or the gap at grade once it is pulled.',
    });
  if (given.gapDepthFt === null && !unread.has('gapDepthFt') && !unread.has('poleLengthFt'))
    faults.push({ field: 'gapDepthFt', text: 'Give the depth of the gap, or the length of the pole.' });
  const noWidth =
    wedgeOf({ ...given.values, gapAtGradeIn: 1, gapDepthFt: 1 }, positiveOf(given.values, 'embedmentFt')) ===
    null;
  if (noWidth && sectionOf(given.values) !== null && !unread.has('gapWidthIn'))
    faults.push({
      field: 'diameterGroundLineIn',
      text: 'The class table lacks this pole: give its size at ground line, or the width of the gap.',
    });
  return faults;
}

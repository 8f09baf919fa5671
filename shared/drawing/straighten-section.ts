import { numberOf, positiveOf } from '#shared/calc/values.ts';
import { sizeAtGrade, wedgeOf, type Wedge } from '#shared/calc/straighten-void.ts';
import type { FieldValues } from '#shared/records/types.ts';

export type Lean = { readonly amount: number; readonly azimuthDeg: number | null };

export type StraightenSection = {
  readonly wedge: Wedge | null;
  readonly poleIn: number | null;
  readonly embedmentFt: number | null;
  /** Inches per 10 ft, and towards where. */
  readonly before: Lean | null;
  readonly after: Lean | null;
  readonly rake: Lean | null;
  /** What it returned when it was let go, inches per 10 ft. */
  readonly springback: number | null;
  readonly waterIn: number | null;
  /**
   * Run over fall in the plane of the lean before, positive towards where the pole leaned. The part of a lean across
   * that plane is not seen in the section; the plan of leans shows it.
   */
  readonly slopes: {
    readonly before: number | null;
    readonly after: number | null;
    readonly rake: number | null;
    /** Held before it was let go. */
    readonly held: number | null;
  };
  /** Deepest thing drawn, ft. */
  readonly deepestFt: number;
  readonly missing: readonly string[];
};

/** Inches per 10 ft as run over fall. */
const PER_FT = 1 / 120;

/** What a *straighten* record looks like in section, as numbers alone. */
export function straightenSection(
  asFound: FieldValues,
  events: readonly FieldValues[] = [],
): StraightenSection {
  const values = lastLeanAfter(asFound, events);
  const wedge = wedgeOf(values, null);
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const depthFt = positiveOf(values, 'gapDepthFt');
  const missing = ['gapAtGradeIn', 'gapDepthFt', 'leanBeforeInPer10Ft', 'leanAfterInPer10Ft'].filter(
    (field) => numberOf(values, field) === null,
  );
  const poleIn = sizeAtGrade(values, null)?.sizeIn ?? null;
  const before = leanOf(values, 'leanBefore');
  const after = leanOf(values, 'leanAfter');
  const rake = leanOf(values, 'designRake');
  const springback = positiveOf(values, 'springbackInPer10Ft');
  const inPlane = (lean: Lean | null) => (lean === null ? null : along(lean, before) * PER_FT);
  const afterSlope = inPlane(after);
  return {
    wedge,
    poleIn,
    embedmentFt,
    before,
    after,
    rake: rake && rake.amount > 0 ? rake : null,
    springback,
    waterIn: positiveOf(values, 'waterIn'),
    slopes: {
      before: before === null ? null : before.amount * PER_FT,
      after: afterSlope,
      rake: rake && rake.amount > 0 ? inPlane(rake) : null,
      held: springback === null || afterSlope === null ? null : afterSlope - springback * PER_FT,
    },
    deepestFt: Math.max(embedmentFt ?? 0, depthFt === null ? 4 : depthFt + 0.6),
    missing: poleIn === null ? [...missing, 'girthGroundLineIn'] : missing,
  };
}

/** As the last event left it, where one says; else as it was after release. */
function lastLeanAfter(values: FieldValues, events: readonly FieldValues[]): FieldValues {
  const last = events.findLast((event) => numberOf(event, 'leanInPer10Ft') !== null);
  if (!last) return values;
  return {
    ...values,
    leanAfterInPer10Ft: numberOf(last, 'leanInPer10Ft'),
    leanAfterAzimuthDeg: numberOf(last, 'leanAzimuthDeg'),
  };
}

function leanOf(values: FieldValues, name: 'leanBefore' | 'leanAfter' | 'designRake'): Lean | null {
  const amount = numberOf(values, `${name}InPer10Ft`);
  return amount === null ? null : { amount, azimuthDeg: numberOf(values, `${name}AzimuthDeg`) };
}

/** Part of a lean along that of before; without a direction of both it counts whole, the worst case. */
function along(lean: Lean, before: Lean | null): number {
  const from = before?.azimuthDeg ?? null;
  if (lean.azimuthDeg === null || from === null) return lean.amount;
  return lean.amount * Math.cos(((lean.azimuthDeg - from) * Math.PI) / 180);
}

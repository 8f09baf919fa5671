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
  /** Deepest thing drawn, ft. */
  readonly deepestFt: number;
  readonly missing: readonly string[];
};

/** What a *straighten* record looks like in section, as numbers alone. */
export function straightenSection(values: FieldValues): StraightenSection {
  const wedge = wedgeOf(values, null);
  const embedmentFt = positiveOf(values, 'embedmentFt');
  const depthFt = positiveOf(values, 'gapDepthFt');
  const missing = ['gapAtGradeIn', 'gapDepthFt', 'leanBeforeInPer10Ft', 'leanAfterInPer10Ft'].filter(
    (field) => numberOf(values, field) === null,
  );
  const poleIn = sizeAtGrade(values, null)?.sizeIn ?? null;
  return {
    wedge,
    poleIn,
    embedmentFt,
    before: leanOf(values, 'leanBefore'),
    after: leanOf(values, 'leanAfter'),
    deepestFt: Math.max(embedmentFt ?? 0, depthFt === null ? 3 : depthFt + 0.6),
    missing: poleIn === null ? [...missing, 'girthGroundLineIn'] : missing,
  };
}

function leanOf(values: FieldValues, name: 'leanBefore' | 'leanAfter'): Lean | null {
  const amount = numberOf(values, `${name}InPer10Ft`);
  return amount === null ? null : { amount, azimuthDeg: numberOf(values, `${name}AzimuthDeg`) };
}

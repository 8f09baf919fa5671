import { classTableOf } from './class-table.ts';
import { GROUND_LINE_FIELDS, sectionOf, tableGirthAt, tapedSize } from './pole-sizes.ts';
import { numberOf, positiveOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** The wedge behind a straightened pole: gaps and width in inches, depth in ft. */
export type Wedge = {
  readonly gapAtGradeIn: number;
  readonly gapAtDepthIn: number;
  readonly widthIn: number;
  readonly depthFt: number;
  /** Where the width comes from: as measured, the pole's taped size, or the class table. */
  readonly widthFrom: 'gapWidthIn' | 'taped' | 'table';
};

/** V = ½·(g₀ + g_h)·w·h, ft³. The opposite gap below the pivot is not counted. */
export function wedgeVoid(wedge: Omit<Wedge, 'widthFrom'>): number {
  const { gapAtGradeIn, gapAtDepthIn, widthIn, depthFt } = wedge;
  return Math.max(0, (0.5 * (gapAtGradeIn + gapAtDepthIn) * widthIn * depthFt) / 144);
}

/** Size of the pole at grade, inches. By the table it needs the embedment; where that is not known, the depth at which such a pole is due to stand. */
export function sizeAtGrade(
  values: FieldValues,
  usualEmbedmentFt: number | null,
): { readonly sizeIn: number; readonly taped: boolean } | null {
  const section = sectionOf(values);
  if (section === null) return null;
  const taped = tapedSize(values, section, GROUND_LINE_FIELDS);
  if (taped !== null) return { sizeIn: taped.sizeIn, taped: true };
  const entry = classTableOf(values);
  const lengthFt = positiveOf(values, 'poleLengthFt');
  const embedmentFt = positiveOf(values, 'embedmentFt') ?? usualEmbedmentFt;
  if (entry === null || lengthFt === null || embedmentFt === null) return null;
  const girth = tableGirthAt(entry, lengthFt, embedmentFt);
  return girth > 0 ? { sizeIn: girth / Math.PI, taped: false } : null;
}

/** The wedge of a *straighten* record; null when a value that it needs is missing. */
export function wedgeOf(values: FieldValues, usualEmbedmentFt: number | null): Wedge | null {
  const gapAtGradeIn = numberOf(values, 'gapAtGradeIn');
  const depthFt = positiveOf(values, 'gapDepthFt');
  if (gapAtGradeIn === null || depthFt === null) return null;
  const gaps = { gapAtGradeIn, gapAtDepthIn: numberOf(values, 'gapAtDepthIn') ?? 0, depthFt };
  const measured = positiveOf(values, 'gapWidthIn');
  if (measured !== null) return { ...gaps, widthIn: measured, widthFrom: 'gapWidthIn' };
  const pole = sizeAtGrade(values, usualEmbedmentFt);
  if (pole === null) return null;
  return { ...gaps, widthIn: pole.sizeIn, widthFrom: pole.taped ? 'taped' : 'table' };
}

import { classTableOf, type ClassTableEntry } from './class-table.ts';
import { isSection, sizeFromGirth, type Section } from './section.ts';
import { positiveOf, textOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** Where a size comes from; `taper` is the other taped size carried over by the class table's taper. */
export type SizeSource = 'girth' | 'diameter' | 'taper' | 'table';
export type PoleSize = { readonly sizeIn: number; readonly source: SizeSource };

export type PoleSizes = {
  readonly section: Section;
  readonly groundLine: PoleSize;
  readonly butt: PoleSize;
  /** False: both sizes come from the class table, a minimum, so that the void is an upper estimate. */
  readonly taped: boolean;
};

/** A taped size; girth counts where girth and diameter are both given. Null when neither is. */
export function tapedSize(
  values: FieldValues,
  section: Section,
  [girthField, diameterField]: readonly [string, string],
): PoleSize | null {
  const girth = positiveOf(values, girthField);
  if (girth !== null) return { sizeIn: sizeFromGirth(section, girth), source: 'girth' };
  const diameter = positiveOf(values, diameterField);
  return diameter === null ? null : { sizeIn: diameter, source: 'diameter' };
}

export const GROUND_LINE_FIELDS = ['girthGroundLineIn', 'diameterGroundLineIn'] as const;
export const BUTT_FIELDS = ['girthButtIn', 'diameterButtIn'] as const;

/** The record's section, round if blank; null for one that is not known. */
export function sectionOf(values: FieldValues): Section | null {
  const text = textOf(values, 'poleSection') ?? 'round';
  return isSection(text) ? text : null;
}

/** Girth taper of a pole of the table, inches per ft: (C₆ − Cₜ)/(L − 6). */
export function girthTaper(entry: ClassTableEntry, lengthFt: number): number {
  return (entry.girthAt6FtIn - entry.girthTopIn) / (lengthFt - 6);
}

/** Girth of a pole of the table at a distance from its butt, inches: straight taper, carried on below the 6 ft point. */
export function tableGirthAt(entry: ClassTableEntry, lengthFt: number, fromButtFt: number): number {
  return entry.girthAt6FtIn + girthTaper(entry, lengthFt) * (6 - fromButtFt);
}

/** Sizes at ground line and butt: taped, or one taped and the table's taper, or the table's. Null where the table is needed and lacks the pole, or without embedment. */
export function poleSizes(values: FieldValues): PoleSizes | null {
  const section = sectionOf(values);
  if (section === null) return null;
  const groundLine = tapedSize(values, section, GROUND_LINE_FIELDS);
  const butt = tapedSize(values, section, BUTT_FIELDS);
  if (groundLine !== null && butt !== null) return { section, groundLine, butt, taped: true };

  const entry = classTableOf(values);
  const lengthFt = positiveOf(values, 'poleLengthFt');
  const embedmentFt = positiveOf(values, 'embedmentFt');
  if (entry === null || lengthFt === null || embedmentFt === null) return null;
  const growth = (girthTaper(entry, lengthFt) * embedmentFt) / Math.PI;
  if (groundLine !== null) {
    return {
      section,
      groundLine,
      butt: { sizeIn: groundLine.sizeIn + growth, source: 'taper' },
      taped: true,
    };
  }
  if (butt !== null) {
    const sizeIn = butt.sizeIn - growth;
    return sizeIn > 0 ? { section, groundLine: { sizeIn, source: 'taper' }, butt, taped: true } : null;
  }
  const girthGroundLine = tableGirthAt(entry, lengthFt, embedmentFt);
  if (!(girthGroundLine > 0)) return null;
  return {
    section,
    groundLine: { sizeIn: girthGroundLine / Math.PI, source: 'table' },
    butt: { sizeIn: tableGirthAt(entry, lengthFt, 0) / Math.PI, source: 'table' },
    taped: false,
  };
}

/** Greatest difference between a size by girth and the same size by diameter, inches; null where no end has both. */
export function girthAgainstDiameterIn(values: FieldValues): number | null {
  const section = sectionOf(values);
  if (section === null) return null;
  let greatest: number | null = null;
  for (const [girthField, diameterField] of [GROUND_LINE_FIELDS, BUTT_FIELDS]) {
    const girth = positiveOf(values, girthField);
    const diameter = positiveOf(values, diameterField);
    if (girth === null || diameter === null) continue;
    const difference = Math.abs(sizeFromGirth(section, girth) - diameter);
    greatest = greatest === null ? difference : Math.max(greatest, difference);
  }
  return greatest;
}

import type { FieldValues } from '#shared/records/types.ts';

/** Names of the readings that a drawing cannot do without, as a person says them. */
const NAMES: Readonly<Record<string, string>> = {
  boreTopIn: 'Bore width',
  boreDepthFt: 'Bore depth',
  embedmentFt: 'Embedment',
  girthGroundLineIn: 'Pole size',
  foamTopBelowGradeIn: 'Foam level',
  waterIn: 'Water',
  rockFromFt: 'Depth of rock',
  gapAtGradeIn: 'Gap at grade',
  gapDepthFt: 'Foamed depth',
  gapWidthIn: 'Width of the gap',
  padLengthIn: 'Pad length',
  padWidthIn: 'Pad width',
  gap1In: 'Gap 1',
  gap2In: 'Gap 2',
  gap3In: 'Gap 3',
  gap4In: 'Gap 4',
  leanBeforeInPer10Ft: 'Lean before',
  leanAfterInPer10Ft: 'Lean after',
};

/** `Bore depth not given`; where the crew wrote so, `Water not measured`. */
export function missingTitle(field: string, values: FieldValues): string {
  return `${missingName(field)} ${values[field] === 'not-measured' ? 'not measured' : 'not given'}`;
}

export function missingName(field: string): string {
  return NAMES[field] ?? field;
}

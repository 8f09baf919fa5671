import type { FieldValues, Kind } from './types.ts';

/** Fields of the bore's diameters. */
export const BORE_FIELDS = ['boreTopIn', 'boreTopAcrossIn', 'boreBottomIn', 'boreBottomAcrossIn'] as const;

/** Fields of the pole's size at grade. */
export const GROUND_LINE_SIZE_FIELDS = ['girthGroundLineIn', 'diameterGroundLineIn', 'poleSection'] as const;

/** Fields that choose the row of the class table. */
export const CLASS_FIELDS = ['poleLengthFt', 'poleClass', 'poleMaterial'] as const;

/** Fields of the pole's sizes below grade, taped or by class. */
export const POLE_FIELDS = [
  ...GROUND_LINE_SIZE_FIELDS,
  ...CLASS_FIELDS,
  'girthButtIn',
  'diameterButtIn',
  'embedmentFt',
] as const;

/** Fields of the annulus: bore and pole. */
export const SIZE_FIELDS = [...BORE_FIELDS, ...POLE_FIELDS] as const;

const isGiven = (values: FieldValues, fields: readonly string[]): boolean =>
  fields.some((field) => typeof values[field] === 'number');

/** Whether sizes were taped where the kind's void needs them: then nothing hangs on the class table. */
export const isTaped = (kind: Kind, values: FieldValues): boolean => {
  const groundLine = isGiven(values, ['girthGroundLineIn', 'diameterGroundLineIn']);
  if (kind === 'straighten') return groundLine || isGiven(values, ['gapWidthIn']);
  return groundLine && isGiven(values, ['girthButtIn', 'diameterButtIn']);
};

/** Of these fields, those on which the sizes of this line hang. */
export const withoutClass = (
  fields: readonly string[],
  { kind, values }: { readonly kind: Kind; readonly values: FieldValues },
): readonly string[] =>
  isTaped(kind, values)
    ? fields.filter((field) => !(CLASS_FIELDS as readonly string[]).includes(field))
    : fields;

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

/** Why a field that is not always required is required here, by field, as the end of a sentence. */
const BECAUSE: Readonly<Record<string, string>> = {
  rockFromFt: 'where the ground is soil over rock',
  bedMaterial: 'where the bore has a bed',
  bedFt: 'where the bore has a bed of stone or native soil',
  wallIn: 'where the butt is open',
  bellIn: 'where a bell height is given',
  bellHeightFt: 'where the bore is belled',
  leanAzimuthDeg: 'where the lean is over 0.25 in per 10 ft',
  leanBeforeAzimuthDeg: 'where the lean before is over 0.25 in per 10 ft',
  leanAfterAzimuthDeg: 'where the lean after is over 0.25 in per 10 ft',
  designRakeAzimuthDeg: 'where the design rake is over 0.25 in per 10 ft',
  openingLengthIn: 'where the opening has a width',
  openingWidthIn: 'where the opening has a length',
  kind: 'where a structure stands on the sheets of two kinds',
};

/** A pole's girth stands for its diameter and the other way about. */
export const ALTERNATIVE: Readonly<Record<string, string>> = {
  diameterGroundLineIn: 'girthGroundLineIn',
  diameterButtIn: 'girthButtIn',
  girthGroundLineIn: 'diameterGroundLineIn',
  girthButtIn: 'diameterButtIn',
};

export const conditionOf = (field: string, because: unknown): string => {
  if (because === 'not-in-class-table') return 'because the class table has no such pole (a girth will do)';
  if (Object.hasOwn(ALTERNATIVE, field)) return 'for a pole that is not wood (a girth will do)';
  return (Object.hasOwn(BECAUSE, field) ? BECAUSE[field] : undefined) ?? 'with what else is given';
};

import { fixedNumbers, NO_FIGURES, type GridRecord } from './testing.ts';

const SECTIONS = ['round', 'round', 'round', 'square', 'hexagonal', 'octagonal', 'dodecagonal'] as const;
const GROUNDS = ['soil', 'soil', 'rock', 'soil-over-rock'] as const;

function pick<T>(from: readonly T[], index: number): T {
  return from[index % from.length] as T;
}

/** Drops a field in some of the structures: what a crew leaves blank. */
function without(values: GridRecord['values'], field: string | null): GridRecord['values'] {
  if (field === null) return values;
  return Object.fromEntries(Object.entries(values).filter(([key]) => key !== field));
}

const SET_BLANK = [
  null,
  null,
  null,
  'boreTopIn',
  'boreDepthFt',
  'embedmentFt',
  'waterIn',
  'foamTopBelowGradeIn',
  'rockFromFt',
  'diameterGroundLineIn',
];

/** Two hundred poles from 25 ft in a 12 in bore to 120 ft in a 48 in bore, every shape of bore and pole, some with a blank. */
export function setGrid(): GridRecord[] {
  const between = fixedNumbers(17);
  return Array.from({ length: 200 }, (_, index): GridRecord => {
    const size = index / 199;
    const boreTopIn = index === 0 ? 12 : index === 199 ? 48 : Math.round(12 + 36 * size);
    const embedmentFt = index === 0 ? 4.5 : index === 199 ? 14 : 4.5 + 9.5 * size + between(-0.4, 0.4);
    const buttIn = boreTopIn * between(0.45, 0.72);
    const overdig = pick([0, 0, 0.02, 0.3, 1], index);
    const values = {
      poleLengthFt: index === 0 ? 25 : index === 199 ? 120 : Math.round((25 + 95 * size) / 5) * 5,
      poleMaterial: pick(['southern-pine', 'steel', 'concrete'], index),
      poleSection: pick(SECTIONS, index),
      ...(index % 11 === 3 ? { buttEnd: 'open', wallIn: 1 } : {}),
      ground: pick(GROUNDS, index),
      rockFromFt: between(0.5, embedmentFt),
      boreTopIn,
      ...(index % 5 === 1 ? { boreTopAcrossIn: boreTopIn + 3 } : {}),
      ...(index % 3 === 1 ? { boreBottomIn: boreTopIn * 0.9 } : {}),
      ...(index % 7 === 2 ? { bellIn: boreTopIn * 1.6, bellHeightFt: 1.2 } : {}),
      ...(index % 6 === 4 ? { bedFt: 0.5, bedMaterial: pick(['native', 'crushed-stone'], index) } : {}),
      ...(index % 8 === 5 ? { slopeRiseIn: between(2, 12) } : {}),
      ...(index % 9 === 6 ? { leastGapIn: 1 } : {}),
      boreDepthFt: embedmentFt + overdig,
      embedmentFt,
      diameterGroundLineIn: buttIn * 0.88,
      diameterButtIn: buttIn,
      foamTopBelowGradeIn: pick([0, -2.5, 4, 0], index),
      waterIn: pick([0, 1.2, 6], index),
    };
    const placedFt3 = between(2, 40);
    return {
      kind: 'set',
      values: without(values, pick(SET_BLANK, index)),
      derived: {
        ...NO_FIGURES,
        voidFt3: 12.4,
        placedFt3: index % 13 === 7 ? null : placedFt3,
        fillRatio: 1.09,
        fillRatioU: 0.08,
        dueFt: index % 17 === 9 ? null : embedmentFt + pick([0, 0.2, -0.6, 1.4], index),
        waterWithPoleIn: pick([0, 2.2, 7.4], index),
        leastAnnulusIn: 3.1,
      },
      pours: Array.from({ length: (index % 3) + 1 }, (__, pour) => ({
        pourNumber: pour + 1,
        event: 1,
        kitFt3: 4,
        quantity: pour + 1,
        wastedQuantity: 0,
      })),
    };
  });
}

const STRAIGHTEN_BLANK = [
  null,
  null,
  null,
  'gapAtGradeIn',
  'gapDepthFt',
  'leanBeforeInPer10Ft',
  'leanAfterInPer10Ft',
  'embedmentFt',
  'diameterGroundLineIn',
];

/** Two hundred straightened poles: lean from little to a fifth of a right angle, every direction, two gaps, rake and springback. */
export function straightenGrid(): GridRecord[] {
  const between = fixedNumbers(29);
  return Array.from({ length: 200 }, (_, index): GridRecord => {
    const size = index / 199;
    const embedmentFt = 4.5 + 9.5 * size;
    const before = 1 + 39 * between(0, 1) * size + 2 * (1 - size);
    const values = {
      poleMaterial: 'southern-pine',
      diameterGroundLineIn: 8 + 18 * size,
      embedmentFt,
      leanBeforeInPer10Ft: before,
      ...(index % 4 === 3 ? {} : { leanBeforeAzimuthDeg: between(0, 359) }),
      leanAfterInPer10Ft: between(0, 2),
      ...(index % 5 === 4 ? {} : { leanAfterAzimuthDeg: between(0, 359) }),
      ...(index % 6 === 1
        ? { designRakeInPer10Ft: between(0.3, 4), designRakeAzimuthDeg: between(0, 359) }
        : {}),
      ...(index % 3 === 2 ? { springbackInPer10Ft: between(0.1, 1) } : {}),
      gapAtGradeIn: before * 0.4 + 0.5,
      ...(index % 2 === 0 ? { gapAtDepthIn: between(0.2, 1) } : {}),
      ...(index % 7 === 0 ? { gapWidthIn: 14 } : {}),
      gapDepthFt: embedmentFt * between(0.5, 0.95),
      waterIn: pick([0, 0, 1.4], index),
    };
    return {
      kind: 'straighten',
      values: without(values, pick(STRAIGHTEN_BLANK, index)),
      derived: { ...NO_FIGURES, voidFt3: 1.08, placedFt3: 1.5, fillRatio: 1.39, fillRatioU: 0.09 },
    };
  });
}

const RELEVEL_BLANK = [
  null,
  null,
  null,
  'gap1In',
  'gap3In',
  'padLengthIn',
  'padWidthIn',
  'slopeBeforeAcrossInPerFt',
  'slopeAfterAcrossInPerFt',
];

/** Two hundred pads from 2 ft to 12 ft a side, long and wide, with and without an opening. */
export function relevelGrid(): GridRecord[] {
  const between = fixedNumbers(41);
  return Array.from({ length: 200 }, (_, index): GridRecord => {
    const padLengthIn = Math.round(between(24, 144));
    const padWidthIn = Math.round(between(24, 144));
    const values = {
      padLengthIn,
      padWidthIn,
      ...(index % 3 === 0 ? {} : { openingLengthIn: padLengthIn * 0.4, openingWidthIn: padWidthIn * 0.45 }),
      gap1In: between(0, 3),
      gap2In: between(0, 6),
      gap3In: between(0, 8),
      gap4In: between(0, 5),
      slopeBeforeAlongInPerFt: between(-1, 1),
      slopeBeforeAcrossInPerFt: between(-2, 2),
      slopeAfterAlongInPerFt: between(-0.2, 0.2),
      slopeAfterAcrossInPerFt: between(-0.3, 0.3),
    };
    return {
      kind: 'relevel',
      values: without(values, pick(RELEVEL_BLANK, index)),
      derived: { ...NO_FIGURES, voidFt3: 2.29, placedFt3: 2.5, fillRatio: 1.09, fillRatioU: 0.12 },
    };
  });
}

import { expect, it } from 'vitest';
import { drawSheet } from './draw-sheet.ts';
import { NO_FIGURES, someFindings } from './testing.ts';

const words = (sentences: readonly string[]) => sentences.join(' ').replaceAll('\u00a0', ' ');

it('says of a set pole all that its drawing shows', () => {
  const { sentences } = drawSheet({
    record: {
      kind: 'set',
      structureNumber: '17-0420',
      values: {
        ground: 'soil-over-rock',
        rockFromFt: 3.5,
        slopeRiseIn: 4,
        poleSection: 'octagonal',
        boreTopIn: 24,
        boreTopAcrossIn: 26,
        boreBottomIn: 22,
        bellIn: 36,
        bellHeightFt: 1,
        boreDepthFt: 8,
        bedFt: 0.5,
        bedMaterial: 'crushed-stone',
        embedmentFt: 7.5,
        diameterGroundLineIn: 12,
        diameterButtIn: 14,
        foamTopBelowGradeIn: -2,
        waterIn: 1.2,
      },
      derived: {
        ...NO_FIGURES,
        voidFt3: 20,
        placedFt3: 21,
        fillRatio: 1.05,
        dueFt: 7,
        waterWithPoleIn: 2.2,
        leastAnnulusIn: 3.4,
      },
      pours: [
        { pourNumber: 1, event: 1, kitFt3: 8, quantity: 1, wastedQuantity: 0 },
        { pourNumber: 2, event: 1, kitFt3: 8, quantity: 2, wastedQuantity: 0 },
      ],
    },
    findings: [],
  });
  const said = words(sentences);
  for (const sentence of [
    'Section through structure 17-0420, a pole set in soil over rock.',
    'Rock begins 3.50 ft down.',
    'Grade rises 4.0 in across the bore; depths are from the low side.',
    'The bore is 8.00 ft deep, 24.0 × 26.0 in wide at the top and 22.0 in at the bottom, belled to 36.0 in.',
    'The octagonal pole is 12.0 in thick at the ground line and 14.0 in at the butt.',
    'It stands 7.50 ft deep; 7.00 ft is due.',
    'It came in 2 lifts, which meet',
    'The foam ends in a crown above grade.',
    'Water stands 2.2 in deep with the pole in, 1.2 in in the open bore.',
    'Below the butt lies a bed of 0.50 ft of crushed stone.',
  ])
    expect(said).toContain(sentence);
});

it('says of a straightened pole both leans, both gaps, rake and springback, and names what is not given', () => {
  const { sentences } = drawSheet({
    record: {
      kind: 'straighten',
      structureNumber: '17-0432',
      values: {
        diameterGroundLineIn: 12,
        leanBeforeInPer10Ft: 9,
        leanBeforeAzimuthDeg: 84,
        designRakeInPer10Ft: 0.5,
        designRakeAzimuthDeg: 10,
        springbackInPer10Ft: 0.3,
        gapAtGradeIn: 5.6,
        gapAtDepthIn: 0.4,
        gapDepthFt: 4.5,
        waterIn: 0.8,
      },
      derived: { ...NO_FIGURES, voidFt3: 1.08, placedFt3: 1.5, fillRatio: 1.39 },
    },
    findings: someFindings('straighten', 1),
  });
  expect(words(sentences)).toBe(
    'Section through structure 17-0432, a pole that was straightened. ' +
      'It leaned 9.0 in per 10 ft towards 84° before. Its lean after is not given. ' +
      'Its design rake is 0.5 in per 10 ft towards 10°. ' +
      'It sprang back 0.3 in per 10 ft when it was let go. ' +
      'The gap behind it is 5.6 in at grade and 0.4 in at its foot, 12.0 in wide, and is foamed 4.50 ft deep. ' +
      'The opposite gap below the pivot is not counted. ' +
      'Water stands 0.8 in deep with the pole in. ' +
      '1.5 ft³ of foam were placed in a void of 1.1 ft³: a fill ratio of 1.39. ' +
      'Not given: lean after. ' +
      'Finding 1: Embedment short; measured 5.8 ft, limit 6 ft, margin −0.2 ft.',
  );
});

it('says of a pad its sizes, four gaps and slopes both ways', () => {
  const { sentences } = drawSheet({
    record: {
      kind: 'relevel',
      structureNumber: '17-0441',
      values: {
        padLengthIn: 48,
        padWidthIn: 42,
        openingLengthIn: 20,
        openingWidthIn: 18,
        gap1In: 1,
        gap2In: 3,
        gap3In: 4,
        gap4In: 2,
        slopeBeforeAlongInPerFt: 0.5,
        slopeBeforeAcrossInPerFt: -1,
        slopeAfterAlongInPerFt: 0.06,
        slopeAfterAcrossInPerFt: 0,
      },
      derived: NO_FIGURES,
    },
    findings: [],
  });
  expect(words(sentences)).toBe(
    'Plan and section of structure 17-0441, a pad that was re-levelled. ' +
      'The pad is 48.0 in from front to back and 42.0 in from left to right. ' +
      'Its opening is 20.0 in by 18.0 in and is not filled. ' +
      'Seen from above, facing the doors, the gaps are 1.0 in front left, 3.0 in back left, 4.0 in back right and 2.0 in front right. ' +
      'The four gaps are 0.0 in from those of a flat pad. ' +
      'It sloped −1.00 in per ft across and 0.50 in per ft along before. ' +
      'It slopes 0.00 in per ft across and 0.06 in per ft along after.',
  );
});

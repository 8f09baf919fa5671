import { describe, expect, it } from 'vitest';
import type { FieldValues } from '#shared/records/types.ts';
import { gapAt, gapContours, contourStepIn } from './gap-contours.ts';
import { leanTip } from './lean-plan.ts';
import { liftShares } from './lift-shares.ts';
import { edgeShares } from './draw-pole.ts';
import { sectionCorners } from './set-plan.ts';
import { relevelPlaces } from './relevel-places.ts';
import { relevelSection } from './relevel-section.ts';
import { setGeometry } from './set-geometry.ts';
import { setSection } from './set-section.ts';
import { sheetFoot, WIDE } from './sheet-spec.ts';
import { straightenPlaces, straightenSpec } from './straighten-places.ts';
import { straightenSection } from './straighten-section.ts';
import { NO_FIGURES } from './testing.ts';

const set: FieldValues = {
  ground: 'soil',
  boreTopIn: 20,
  boreDepthFt: 6,
  embedmentFt: 6,
  diameterGroundLineIn: 12,
  diameterButtIn: 12,
  foamTopBelowGradeIn: 0,
  waterIn: 1.2,
};

describe('the section of a set pole', () => {
  it('is drawn to one scale both ways', () => {
    const section = setSection({ values: set, derived: { ...NO_FIGURES, dueFt: 6 } });
    const { scale, bore, pole } = setGeometry(section, WIDE);
    // By hand: (566 − 156) units for 6 ft is 68.3333 a foot; 20 in is 1.6667 ft, half of it 56.9444 units from 256.
    expect(scale).toBeCloseTo(68.3333, 4);
    expect(bore?.left).toBeCloseTo(199.0556, 3);
    expect(bore?.right).toBeCloseTo(312.9444, 3);
    expect(bore?.bottomY).toBeCloseTo(566, 6);
    // 12 in: 0.5 ft to either side, 34.1667 units.
    expect(pole?.left).toBeCloseTo(221.8333, 3);
    expect(pole?.buttY).toBeCloseTo(566, 6);
  });

  it('is as large as the widest part allows: 48 in bore, 14 ft deep; 12 in bore, 4.5 ft deep', () => {
    const big = setSection({
      values: { ...set, boreTopIn: 48, boreDepthFt: 14, embedmentFt: 14 },
      derived: { ...NO_FIGURES, dueFt: 14 },
    });
    // 410 units for 14 ft: 29.2857 a foot (104 units for half of 4 ft would be 52).
    expect(setGeometry(big, WIDE).scale).toBeCloseTo(29.2857, 4);
    const small = setSection({
      values: {
        ...set,
        boreTopIn: 12,
        boreDepthFt: 4.5,
        embedmentFt: 4.5,
        diameterGroundLineIn: 7,
        diameterButtIn: 8,
      },
      derived: { ...NO_FIGURES, dueFt: 4.5 },
    });
    // 410 / 4.5 would be 91: no more than 70, so that a small pole does not look like a large one.
    expect(setGeometry(small, WIDE).scale).toBe(70);
  });

  it('shows the foam in lifts: 2 and 1 kits of 4 ft³ are two thirds and one third', () => {
    const pours = [
      { pourNumber: 2, event: 1, kitFt3: 4, quantity: 1, wastedQuantity: 0 },
      { pourNumber: 1, event: 1, kitFt3: 4, quantity: 3, wastedQuantity: 1 },
    ];
    expect(liftShares(pours).map((share) => share.toFixed(4))).toEqual(['0.6667', '0.3333']);
    // Annulus π/4·(20² − 12²)/144 = 1.3963 ft²; 4.18879 ft³ stands 3 ft high, its first two thirds 2 ft: level 4 ft down.
    const section = setSection({ values: set, derived: { ...NO_FIGURES, placedFt3: 4.18879 }, pours });
    expect(section.foam?.topFt).toBeCloseTo(3, 4);
    expect(section.foam?.liftsFt).toHaveLength(1);
    expect(section.foam?.liftsFt[0]).toBeCloseTo(4, 4);
  });

  it('ends where the last event left it: 9 in down as found, topped up to grade', () => {
    const found = { ...set, foamTopBelowGradeIn: 9 };
    const events = [{ event: 2, foamTopBelowGradeIn: 0 }];
    expect(setSection({ values: found, derived: NO_FIGURES }).foam?.topFt).toBe(0.75);
    expect(setSection({ values: found, derived: NO_FIGURES, events }).foam?.topFt).toBe(0);
  });

  it('shows no lifts where the amount of one is not known', () => {
    expect(liftShares([{ pourNumber: 1, event: 1, kitFt3: null, quantity: 1, wastedQuantity: 0 }])).toEqual(
      [],
    );
  });

  it('keeps the water of the open bore beside that with the pole in', () => {
    // 1.2 in open stands at 2.16 in with a 12 in butt on the bottom of an 18 in bore: common practice, factor 1.8.
    const section = setSection({ values: set, derived: { ...NO_FIGURES, waterWithPoleIn: 2.16 } });
    expect(section.waterFt).toBeCloseTo(0.18, 10);
    expect(section.openWaterFt).toBeCloseTo(0.1, 10);
    const withPole = setSection({
      values: { ...set, waterMeasured: 'with-pole' },
      derived: { ...NO_FIGURES, waterWithPoleIn: 1.2 },
    });
    expect(withPole.openWaterFt).toBeNull();
  });

  it('puts a dashed sign where bore or pole was not measured, with what is known of it', () => {
    const { ghosts } = setSection({
      values: { boreTopIn: 24, embedmentFt: 6 },
      derived: { ...NO_FIGURES, dueFt: 7 },
    });
    expect(ghosts.bore).toEqual({ halfTopFt: 1, halfBottomFt: 1, depthFt: 6, open: true, knownWidth: true });
    // 0.6 of 24 in, halved, in feet.
    expect(ghosts.pole).toEqual({
      halfTopFt: 0.6,
      halfBottomFt: 0.6,
      depthFt: 6,
      open: false,
      knownWidth: false,
    });
    expect(setSection({ values: set, derived: NO_FIGURES }).ghosts).toEqual({ bore: null, pole: null });
  });
});

describe('a section across a pole', () => {
  it('has its flats upright and its corners beyond them', () => {
    // Square, 6 to a flat: corners at (±6, ±6).
    expect(
      sectionCorners('square', { x: 0, y: 0 }, 6).map(({ x, y }) => [Math.round(x), Math.round(y)]),
    ).toEqual([
      [6, 6],
      [-6, 6],
      [-6, -6],
      [6, -6],
    ]);
    // Regular octagon: corner radius is 1/cos(22.5°) = 1.0824 of half the width across flats.
    const [corner] = sectionCorners('octagonal', { x: 0, y: 0 }, 1);
    expect(Math.hypot(corner?.x ?? 0, corner?.y ?? 0)).toBeCloseTo(1.0824, 4);
  });

  it('shows its near edges from the side: of an octagon at 29 and 71 hundredths of its width', () => {
    // Half side over half width: tan(22.5°) = 0.4142; (1 ∓ 0.4142)/2.
    expect(edgeShares(8)).toEqual([0.29, 0.71]);
    expect(edgeShares(4)).toEqual([]);
    // A hexagon with a flat at either side has one edge in the middle.
    expect(edgeShares(6)).toEqual([0.5]);
  });
});

describe('a straightened pole', () => {
  const values: FieldValues = {
    poleMaterial: 'southern-pine',
    diameterGroundLineIn: 12,
    embedmentFt: 6,
    leanBeforeInPer10Ft: 9,
    leanBeforeAzimuthDeg: 90,
    leanAfterInPer10Ft: 1.2,
    leanAfterAzimuthDeg: 150,
    springbackInPer10Ft: 0.3,
    gapAtGradeIn: 4,
    gapAtDepthIn: 0.5,
    gapDepthFt: 4.5,
  };

  it('leans in the plane of the lean before: 1.2 at 60° from it is 0.6 in per 10 ft', () => {
    const { slopes } = straightenSection(values);
    expect(slopes.before).toBeCloseTo(9 / 120, 10);
    expect(slopes.after).toBeCloseTo(0.6 / 120, 10);
    // Held 0.3 further back.
    expect(slopes.held).toBeCloseTo(0.3 / 120, 10);
  });

  it('leans as the last event left it', () => {
    const events: FieldValues[] = [{ leanInPer10Ft: 0.24, leanAzimuthDeg: 90 }, { waterIn: 0 }];
    expect(straightenSection(values, events).slopes.after).toBeCloseTo(0.24 / 120, 10);
  });

  it('carries its wedge between its face and the soil, both gaps to scale', () => {
    const spec = straightenSpec(WIDE);
    const section = straightenSection(values);
    const places = straightenPlaces(section, spec);
    // 566 − 240 = 326 units for 6 ft: 54.3333 a foot. 4 in: 18.1111 units; 0.5 in: 2.2639.
    expect(places.scale).toBeCloseTo(54.3333, 4);
    const [poleTop, soilTop, soilFoot, poleFoot] = places.wedge ?? [];
    expect((soilTop?.x ?? 0) - (poleTop?.x ?? 0)).toBeCloseTo(18.1111, 3);
    expect((soilFoot?.x ?? 0) - (poleFoot?.x ?? 0)).toBeCloseTo(2.2639, 3);
    expect(soilFoot?.y).toBeCloseTo(240 + 4.5 * 54.3333, 2);
    // 1 ft above grade the face before stands 9/120 ft further out than at grade.
    const former = places.former;
    expect((former?.(1, -1).x ?? 0) - (former?.(1, 0).x ?? 0)).toBeCloseTo((9 / 120) * 54.3333, 3);
  });

  it('points its leans by the compass, north up', () => {
    const centre = { x: 100, y: 100 };
    expect(leanTip(centre, { amount: 2, azimuthDeg: 0 }, 10)).toEqual({ x: 100, y: 80 });
    expect(leanTip(centre, { amount: 2, azimuthDeg: 90 }, 10)?.x).toBeCloseTo(120, 10);
    expect(leanTip(centre, { amount: 2, azimuthDeg: null }, 10)).toBeNull();
  });
});

describe('a re-levelled pad', () => {
  it('has contours of its gap: from 1 in front left to 4 in back right, every half inch', () => {
    // Front left, back left, back right, front right. A plane: 1 + u·1 + v·2.
    const gaps = [1, 3, 4, 2] as const;
    expect(gapAt(gaps, { u: 0.5, v: 0.5 })).toBe(2.5);
    // 3 in over six lines at most: every 0.5 in.
    expect(contourStepIn(gaps)).toBe(0.5);
    const contours = gapContours(gaps);
    expect(contours.map((one) => one.levelIn)).toEqual([1.5, 2, 2.5, 3, 3.5]);
    // 2.5 in: v = 0.75 at the left edge, 0.25 at the right.
    const middle = contours[2]?.points ?? [];
    expect([middle[0], middle.at(-1)]).toEqual([
      { u: 0, v: 0.75 },
      { u: 1, v: 0.25 },
    ]);
  });

  it('has none where the gaps are equal', () => {
    expect(gapContours([2, 2, 2, 2])).toEqual([]);
  });

  it('is drawn to scale: 60 in long is 248 units, 48 in wide 198.4; 2 in mean gap 8.27', () => {
    const section = relevelSection({
      padLengthIn: 60,
      padWidthIn: 48,
      gap1In: 1,
      gap2In: 3,
      gap3In: 4,
      gap4In: 2,
    });
    const places = relevelPlaces(section, WIDE);
    expect(places.frontY - places.backY).toBeCloseTo(248, 6);
    expect(places.right - places.left).toBeCloseTo(198.4, 6);
    expect(places.deepLeftY - places.padY).toBeCloseTo(2 * (248 / 60), 6);
    expect(places.deepRightY - places.padY).toBeCloseTo(3 * (248 / 60), 6);
  });
});

it('leaves room for a small plan above the title block', () => {
  // Title block of four rows of 39 units: 770 − 22 − 156 = 592; plan 104 high, 16 above it.
  const foot = sheetFoot(WIDE, { titleHeight: 156, inset: true, stamp: false });
  expect([foot.height, foot.titleTop, foot.inset.y, foot.labelsBottom]).toEqual([770, 592, 472, 458]);
});

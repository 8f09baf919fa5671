import { describe, expect, it, test } from 'vitest';
import { bisect } from './bisect.ts';
import { boreAreaAt, boreProfile, boreVolume } from './bore-profile.ts';
import { deriveStraighten } from './derive-straighten.ts';
import { dueDepthFt } from './due-depth.ts';
import { worstReading } from './fill-uncertainty.ts';
import { geoAreaOf, isInArea } from './geo-area.ts';
import { geodesicDistanceM } from './geodesic-distance.ts';
import { interpolate } from './interpolate.ts';
import { leanDeviation } from './lean.ts';
import { coldestComponentF } from './placed-volume.ts';
import { poleAreaAt, poleSizeAt } from './pole-profile.ts';
import { girthAgainstDiameterIn, poleSizes } from './pole-sizes.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';

/** What a computation gives exactly where one case ends and the next begins. */

describe('bisect', () => {
  it('gives the upper bound for what is reached there', () => {
    expect(bisect((x) => Math.min(x, 1), 1, [0, 2])).toBe(2);
  });

  it('gives the lower end of a level stretch', () => {
    const rising = (x: number) => (x < 1 ? x : x < 2 ? 1 : x - 1);
    expect(bisect(rising, 1, [0, 4])).toBeCloseTo(1, 12);
  });
});

describe('the bore', () => {
  const bore = (values: Record<string, number>) =>
    boreProfile({ boreDepthFt: 6, boreTopIn: 18, ...values }) ?? {
      depthFt: 0,
      parts: [],
      leastIn: 0,
      greatestIn: 0,
    };

  it.each([
    // π/4·1.5²·6 ft³.
    ['plain', {}, 10.602875205865551],
    ['with a bell that has no height', { bellIn: 30 }, 10.602875205865551],
    ['with a bell that has no size', { bellHeightFt: 1 }, 10.602875205865551],
    // π/4·1.5²·5 + π/12·(1.5² + 1.5·2.5 + 2.5²).
    ['belled', { bellIn: 30, bellHeightFt: 1 }, 12.042771838760874],
    // π/12·6·(1.5² + 1.5·2.5 + 2.5²): all of it is bell.
    ['with a bell as tall as itself', { bellIn: 30, bellHeightFt: 6 }, 19.24225500323748],
  ])('holds, %s', (_what, values, ft3) => {
    expect(boreVolume(bore(values), 0, 6)).toBeCloseTo(ft3, 9);
  });

  // π/4·18² in².
  it.each([
    ['plain', {}],
    ['with a bell as tall as itself', { bellIn: 30, bellHeightFt: 6 }],
  ])('is open at grade, %s', (_what, values) => {
    expect(boreAreaAt(bore(values), 0)).toBeCloseTo(254.46900494077323, 9);
  });
});

describe('depth due, rock under soil', () => {
  // 60 ft: soil 8 ft, rock 5 ft; the shallow rule up to 2 ft and up to its slack of 1e-9.
  it.each([
    [2, 7],
    [2.000000001, 7],
    [2.1, 8],
  ])('from %d ft', (rockFromFt, dueFt) => {
    const values = { poleLengthFt: 60, ground: 'soil-over-rock', boreTopIn: 20, rockFromFt };
    expect(dueDepthFt({ values, standard: DEMO_STANDARD })).toBeCloseTo(dueFt, 6);
  });

  // The soil column from 24 in of bore on, with a slack of 1e-9.
  it.each([
    [24, 6],
    [23.999999999, 6],
    [23.9, 4],
  ])('a bore of %d in', (boreTopIn, dueFt) => {
    const values = { poleLengthFt: 40, ground: 'rock', boreTopIn };
    expect(dueDepthFt({ values, standard: DEMO_STANDARD })).toBe(dueFt);
  });

  // The row of 40 ft, with a slack of 1e-9; the next row is 45 ft.
  it.each([
    [40, 6],
    [40.000000001, 6],
    [40.1, 6.5],
  ])('a pole of %d ft', (poleLengthFt, dueFt) => {
    expect(dueDepthFt({ values: { poleLengthFt, ground: 'soil' }, standard: DEMO_STANDARD })).toBe(dueFt);
  });
});

describe('the reading to measure again', () => {
  const flat = () => 1;
  const moving = (by: number) => 1 + by;

  it('is none where the only group has no uncertainty', () => {
    expect(worstReading([{ u: 0, shifted: moving, readings: [{ field: 'a', shifted: moving }] }])).toBeNull();
  });

  it('is none where no reading of the group moves the void', () => {
    expect(worstReading([{ u: 1, shifted: moving, readings: [{ field: 'a', shifted: flat }] }])).toBeNull();
  });

  // u/x of the width, 0.1/4 and 0.5/4 from the table, is over 0.125/20 of the gap and 0.5/72 of the depth.
  it.each([
    ['taped by diameter', { diameterGroundLineIn: 4 }, 'diameterGroundLineIn', true],
    ['taped by girth', { girthGroundLineIn: 12.566 }, 'girthGroundLineIn', true],
    ['a width of its own', { gapWidthIn: 4, girthGroundLineIn: 40 }, 'gapWidthIn', true],
    [
      'from the class table',
      { poleMaterial: 'southern-pine', poleLengthFt: 40, poleClass: '4' },
      'girthGroundLineIn',
      false,
    ],
  ])('is the width of a straightened pole: %s', (_what, width, field, poleTaped) => {
    const values = { gapAtGradeIn: 20, gapDepthFt: 6, ...width };
    const derived = deriveStraighten({ values, pours: [], standard: DEMO_STANDARD, product: DEMO_PRODUCT });
    expect(derived).toMatchObject({ worstReading: field, poleTaped });
  });
});

describe('areas', () => {
  const polygon = (...ring: (readonly [number, number])[]) =>
    geoAreaOf({ type: 'Polygon', coordinates: [ring] }) ?? [];
  const square = polygon([0, 0], [10, 0], [10, 10], [0, 10]);

  it.each([
    ['the upper edge', 5, 10],
    ['the lower edge', 5, 0],
    ['the left edge', 0, 5],
    ['the right edge', 10, 5],
    ['a corner', 10, 10],
  ])('count %s as inside', (_what, longitude, latitude) => {
    expect(isInArea(square, { longitude, latitude })).toBe(true);
  });

  it('take three corners, and 1e-15 beside an edge for on it', () => {
    const triangle = polygon([0, 0], [1, 1], [0, 1]);
    expect(isInArea(triangle, { longitude: 0.25, latitude: 0.75 })).toBe(true);
    expect(isInArea(triangle, { longitude: 1e-15, latitude: 0 })).toBe(true);
    expect(isInArea(triangle, { longitude: 2e-15, latitude: 0 })).toBe(false);
  });
});

// By GeographicLib (Karney 2013): the quarter meridian, and from 60° north over the pole to 60° north.
test.each([
  ['pole to equator', [90, 0], [0, 0], 10001965.729312724],
  ['equator to pole', [0, 0], [90, 0], 10001965.729312724],
  ['south pole to equator', [-90, 0], [0, 0], 10001965.729312724],
  ['over the pole', [60, 0], [60, 180], 6695785.819644422],
  ['over the pole, the other way', [60, 180], [60, 0], 6695785.819644422],
] as const)('distance: %s', (_what, [latitude, longitude], [to, toLongitude], metres) => {
  const distance = geodesicDistanceM({ latitude, longitude }, { latitude: to, longitude: toLongitude });
  expect(distance).toBeCloseTo(metres, 3);
});

test('two points of one x: the first counts there, the second after it', () => {
  const step = [
    [0, 1],
    [5, 2],
    [5, 3],
    [10, 3],
  ] as const;
  expect([5, 5.1].map((x) => interpolate(step, x))).toEqual([2, 3]);
});

describe('leans', () => {
  it('may lack a direction up to 0.25 in per 10 ft and its slack of 1e-9', () => {
    const none = { inPer10Ft: 0, azimuthDeg: null };
    expect(leanDeviation({ inPer10Ft: 0.250000001, azimuthDeg: null }, none)).toBe(0.250000001);
    expect(leanDeviation({ inPer10Ft: 0.25000001, azimuthDeg: null }, none)).toBeNull();
  });

  // 1e-12 is none: it is added whatever its direction.
  it('of 1e-12 have no direction that matters', () => {
    const none = { inPer10Ft: 1e-12, azimuthDeg: 0 };
    const lean = { inPer10Ft: 2, azimuthDeg: 0 };
    expect(leanDeviation(none, lean)).toBe(2.000000000001);
    expect(leanDeviation(lean, none)).toBe(2.000000000001);
  });
});

test('the coldest component is that of any row', () => {
  const row = (componentATempF: number, componentBTempF: number) => ({
    kitFt3: 8,
    quantity: 1,
    wastedQuantity: 0,
    componentATempF,
    componentBTempF,
  });
  expect(coldestComponentF([row(72, 50), row(60, 65)])).toBe(50);
  expect(coldestComponentF([row(72, 70), row(60, 65)])).toBe(60);
  expect(coldestComponentF([])).toBeNull();
});

describe('the pole', () => {
  const pole = { section: 'square', embedmentFt: 6, groundLineIn: 10, buttIn: 10, openWallIn: null } as const;

  // 10 × 10 in, and less an inside of 8 × 8 in.
  it('takes up its section, or its wall alone where it is open', () => {
    expect(poleAreaAt(pole, 6)).toBeCloseTo(100, 9);
    expect(poleAreaAt({ ...pole, openWallIn: 1 }, 6)).toBeCloseTo(36, 9);
    expect(poleAreaAt(pole, 6.001)).toBe(0);
  });

  it('that is not embedded has the size of its ground line', () => {
    expect(poleSizeAt({ ...pole, embedmentFt: 0, buttIn: 12 }, 0)).toBe(10);
  });

  // 40 ft, class 4: (33.5 − 21)/34 in per ft, over 6 ft and π: 0.70215 in. Thinner than that it ends at grade.
  it('has no sizes where its taper leaves nothing at grade', () => {
    const values = { poleMaterial: 'southern-pine', poleLengthFt: 40, poleClass: '4', embedmentFt: 6 };
    expect(poleSizes({ ...values, diameterButtIn: 0.7021541606995383 })).toBeNull();
    expect(poleSizes({ ...values, diameterButtIn: 0.7022 })).not.toBeNull();
    // 40 ft, H1: 43.5 in of girth less 0.42647 in per ft over 102 ft is 0.
    expect(poleSizes({ ...values, poleClass: 'H1', embedmentFt: 108 })).toBeNull();
  });

  // 40/π − 12 = 0.7324 in at the ground line, 37.699/π − 12 = 0 at the butt.
  it('tells the greatest difference of girth and diameter, of whichever end', () => {
    const [girth, round] = [40, 37.69911184307752];
    const at = (girthGroundLineIn: number, girthButtIn: number) =>
      girthAgainstDiameterIn({
        girthGroundLineIn,
        diameterGroundLineIn: 12,
        girthButtIn,
        diameterButtIn: 12,
      });
    expect(at(girth, round)).toBeCloseTo(0.7323954473516269, 9);
    expect(at(round, girth)).toBeCloseTo(0.7323954473516269, 9);
  });
});

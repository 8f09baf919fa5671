import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { deriveRelevel } from './derive-relevel.ts';
import { deriveSet } from './derive-set.ts';
import { deriveStraighten } from './derive-straighten.ts';
import { setGeometry } from './set-geometry.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import type { FieldValues } from '#shared/records/types.ts';

const standard = DEMO_STANDARD;
const product = DEMO_PRODUCT;
const pour = { kitFt3: 8, quantity: 1, wastedQuantity: 0, componentATempF: 72, componentBTempF: 70 };
const set: FieldValues = {
  poleMaterial: 'southern-pine',
  poleLengthFt: 40,
  poleClass: '4',
  ground: 'soil',
  embedmentFt: 6,
  boreDepthFt: 6,
  boreTopIn: 20,
  girthGroundLineIn: 35,
  girthButtIn: 38,
  foamTopBelowGradeIn: 0,
  waterIn: 0,
};

describe('derived figures are total', () => {
  const fields = Object.keys({
    ...set,
    boreTopAcrossIn: 0,
    boreBottomIn: 0,
    bellIn: 0,
    bellHeightFt: 0,
    bedFt: 0,
    bedMaterial: '',
    buttEnd: '',
    wallIn: 0,
    poleSection: '',
    rockFromFt: 0,
    slopeRiseIn: 0,
    waterMeasured: '',
    leastGapIn: 0,
    gapAtGradeIn: 0,
    gapAtDepthIn: 0,
    gapDepthFt: 0,
    gapWidthIn: 0,
    padLengthIn: 0,
    padWidthIn: 0,
    openingLengthIn: 0,
    openingWidthIn: 0,
    gap1In: 0,
    gap2In: 0,
    gap3In: 0,
    gap4In: 0,
  });
  const value = fc.oneof(
    fc.double(),
    fc.integer({ min: -5, max: 60 }),
    fc.constantFrom(
      '',
      'not-measured',
      'round',
      'octagonal',
      'open',
      'rock',
      'soil-over-rock',
      'native',
      '__proto__',
      null,
      true,
    ),
  );
  const anything = fc.dictionary(fc.constantFrom(...fields), value);
  const amount = fc.oneof(fc.double({ noNaN: false }), fc.constant(null));
  const anyPour = fc.record({
    kitFt3: amount,
    quantity: amount,
    wastedQuantity: fc.double(),
    componentATempF: amount,
    componentBTempF: amount,
  });

  test.each([deriveSet, deriveStraighten, deriveRelevel])('%o', (derive) => {
    fc.assert(
      fc.property(anything, fc.array(anyPour, { maxLength: 3 }), (changes, pours) => {
        const derived = derive({ values: { ...set, ...changes }, pours, standard, product });
        const numbers = Object.values(derived).filter((figure) => typeof figure === 'number');
        expect(numbers.filter((figure) => !Number.isFinite(figure))).toEqual([]);
      }),
    );
  });

  test('so is the geometry to draw', () => {
    fc.assert(
      fc.property(anything, fc.double(), (changes, placedFt3) => {
        expect(() => setGeometry({ ...set, ...changes }, { placedFt3 })).not.toThrow();
      }),
    );
  });
});

describe('what is missing is null, the rest stands', () => {
  test('no product: no placed volume', () => {
    const derived = deriveSet({ values: set, pours: [pour], standard, product: null });
    expect(derived).toMatchObject({ placedFt3: null, fillRatio: null, fillRatioU: null, dueFt: 6 });
    expect(derived.voidFt3).toBeCloseTo(8.6701, 4);
    expect(derived.worstReading).toBe('boreTopIn');
  });

  test('no pour, or a temperature not measured: no placed volume', () => {
    expect(deriveSet({ values: set, pours: [], standard, product }).placedFt3).toBeNull();
    const unknown = [{ ...pour, componentBTempF: null }];
    expect(deriveSet({ values: set, pours: unknown, standard, product }).placedFt3).toBeNull();
  });

  test('nothing at all', () => {
    expect(deriveSet({ values: {}, pours: [], standard, product })).toEqual({
      voidFt3: null,
      placedFt3: null,
      fillRatio: null,
      fillRatioU: null,
      dueFt: null,
      waterWithPoleIn: null,
      leastAnnulusIn: null,
      poleTaped: null,
      worstReading: null,
    });
  });
});

test('the design depth counts where it is the larger', () => {
  const due = (designEmbedmentFt: number | null) =>
    deriveSet({ values: set, pours: [pour], standard, product, designEmbedmentFt }).dueFt;
  expect([due(null), due(5), due(7.5)]).toEqual([6, 6, 7.5]);
});

test('fill is all events’ foam over the void to the last level', () => {
  const low = { ...set, foamTopBelowGradeIn: 6 };
  const events: FieldValues[] = [{ event: 2, foamTopBelowGradeIn: 0 }, { event: 3 }];
  const derived = deriveSet({ values: low, pours: [pour, pour], standard, product, events });
  // Voids of the worked records WR-01 and WR-09: 8.6701 at grade, 7.9202 six inches below.
  expect(derived.voidFt3).toBeCloseTo(8.6701, 4);
  expect(derived.placedFt3).toBe(16);
});

describe('the reading to measure again first', () => {
  const worst = (values: FieldValues) =>
    deriveSet({ values: { ...set, ...values }, pours: [pour], standard, product }).worstReading;

  test('of a tapered bore, the end that moves the void most', () => {
    expect(worst({ boreTopIn: 24, boreBottomIn: 20 })).toBe('boreTopIn');
    expect(worst({ boreTopIn: 20, boreBottomIn: 24 })).toBe('boreBottomIn');
  });

  test('a pole from the class table is to be taped', () => {
    const untaped = { ...set, boreTopIn: 14, girthGroundLineIn: null, girthButtIn: null };
    expect(deriveSet({ values: untaped, pours: [pour], standard, product }).worstReading).toBe('girthButtIn');
  });

  test('of a gap, and of a pad', () => {
    const wedge = { gapAtGradeIn: 0.5, gapDepthFt: 4, gapWidthIn: 12 };
    expect(deriveStraighten({ values: wedge, pours: [pour], standard, product }).worstReading).toBe(
      'gapAtGradeIn',
    );
    const pad = { padLengthIn: 40, padWidthIn: 40, gap1In: 1, gap2In: 2, gap3In: 2, gap4In: 1 };
    expect(deriveRelevel({ values: pad, pours: [pour], standard, product }).worstReading).toBe('gap1In');
  });
});

// u_V/V = hypot(0.125/4, 0.1/11, 0.5/54), u_P/P = 0.03, R = 2.181818: U = 2 R √(…) = 0.1973 by hand.
test('uncertainty of a straightened pole’s fill', () => {
  const values = { gapAtGradeIn: 4, gapDepthFt: 4.5, diameterGroundLineIn: 11 };
  const derived = deriveStraighten({ values, pours: [{ ...pour, kitFt3: 1.5 }], standard, product });
  expect(derived.fillRatioU).toBeCloseTo(0.1973, 3);
});

// u_V/V = 0.125/2.5, u_P/P = 0.03, R = 1.745455: U = 0.20355 by hand.
test('uncertainty of a pad’s fill', () => {
  const values = {
    padLengthIn: 48,
    padWidthIn: 42,
    openingLengthIn: 24,
    openingWidthIn: 18,
    gap1In: 1,
    gap2In: 3,
    gap3In: 4,
    gap4In: 2,
  };
  const derived = deriveRelevel({ values, pours: [{ ...pour, kitFt3: 4 }], standard, product });
  expect(derived.fillRatioU).toBeCloseTo(0.2036, 3);
});

test('without embedment a pole of the table is taken at its usual depth', () => {
  const wedge = {
    ...set,
    gapAtGradeIn: 4,
    gapDepthFt: 3,
    embedmentFt: null,
    girthGroundLineIn: null,
    girthButtIn: null,
  };
  const derived = deriveStraighten({ values: wedge, pours: [], standard, product });
  // 40 ft class 4 at 6 ft: 33.5/π = 10.66338 in; ½ · 4 · 10.66338 · 3 / 144.
  expect(derived.voidFt3).toBeCloseTo(0.44431, 5);
  expect(derived.poleTaped).toBe(false);
});

describe('geometry to draw', () => {
  test('the placed volume reaches the level that it fills', () => {
    // A 20 in bore less a 10 in pole holds 235.619 in² = 1.636246 ft² a foot: 4.908739 ft³ fill 3 ft.
    const values = {
      ...set,
      girthGroundLineIn: null,
      girthButtIn: null,
      diameterGroundLineIn: 10,
      diameterButtIn: 10,
    };
    const drawn = setGeometry(values, { placedFt3: 4.908738521, dueFt: 6 });
    expect(drawn?.placedTopFt).toBeCloseTo(3, 6);
    expect(setGeometry(values, { placedFt3: 100 })?.placedTopFt).toBe(0);
    expect(setGeometry(values)?.placedTopFt).toBeNull();
    expect(drawn).toMatchObject({ foamTopFt: 0, foamBottomFt: 6, bed: null, waterFt: null, dueFt: 6 });
  });

  test('water stands at its levels, a crown above grade', () => {
    const drawn = setGeometry({
      ...set,
      waterIn: 6,
      foamTopBelowGradeIn: -3,
      bedMaterial: 'native',
      bedFt: 0.5,
      boreDepthFt: 6.5,
    });
    expect(drawn?.waterOpenFt).toBeCloseTo(6, 9);
    expect(drawn?.waterFt).toBeLessThan(6);
    expect(drawn?.foamTopFt).toBe(-0.25);
    expect(drawn?.bed).toEqual({ topFt: 6, bottomFt: 6.5, material: 'native' });
  });
});

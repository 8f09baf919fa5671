import { describe, expect, it } from 'vitest';
import type { Derived, FieldValues } from '#shared/records/types.ts';
import { boreWall, setSection as sectionOf } from './set-section.ts';

const setSection = (values: FieldValues, figures: Derived) => sectionOf({ values, derived: figures });

const derived: Derived = {
  voidFt3: null,
  placedFt3: null,
  fillRatio: null,
  fillRatioU: null,
  dueFt: 6,
  waterWithPoleIn: null,
  leastAnnulusIn: null,
  poleTaped: true,
  worstReading: null,
};

/** A straight 20 in bore, 6 ft deep, round a straight 12 in pole: the annulus is π/4·(20² − 12²)/144 = 1.3963 ft². */
const straight: FieldValues = {
  ground: 'soil',
  boreTopIn: 20,
  boreDepthFt: 6,
  embedmentFt: 6,
  diameterGroundLineIn: 12,
  diameterButtIn: 12,
  foamTopBelowGradeIn: 0,
  waterIn: 0,
};

describe('setSection', () => {
  it('fills the bore to the level that the placed volume reaches', () => {
    // Half of the void, 4.18879 ft³ = 1.3963 ft² × 3 ft: by hand.
    const section = setSection(straight, { ...derived, placedFt3: 4.18879 });
    expect(section.foam?.topFt).toBeCloseTo(3, 4);
    expect(section.foam?.bottomFt).toBe(6);
    expect(section.foam?.recordedTopFt).toBe(0);
    expect(section.foam?.crownFt).toBe(0);
  });

  it('fills to grade and no higher when more was placed, with the crown as recorded', () => {
    const section = setSection({ ...straight, foamTopBelowGradeIn: -2.4 }, { ...derived, placedFt3: 12 });
    expect(section.foam?.topFt).toBe(0);
    expect(section.foam?.recordedTopFt).toBeNull();
    expect(section.foam?.crownFt).toBeCloseTo(0.2, 10);
  });

  it('fills the over-dig under the butt and leaves the bed out', () => {
    const section = setSection(
      { ...straight, boreDepthFt: 7, bedFt: 0.5, bedMaterial: 'crushed-stone' },
      { ...derived, placedFt3: 100 },
    );
    expect(section.foam?.bottomFt).toBe(6.5);
    expect(section.bed).toEqual({ heightFt: 0.5, material: 'crushed-stone' });
    expect(section.deepestFt).toBe(7);
  });

  it('stands the pole off centre where the least gap says so', () => {
    // Centred it would be (20 − 12)/2 = 4 in; 3 in measured is 1 in off.
    expect(setSection({ ...straight, leastGapIn: 3 }, derived).poleOffsetFt).toBeCloseTo(1 / 12, 10);
    expect(setSection({ ...straight, leastGapIn: 5 }, derived).poleOffsetFt).toBe(0);
  });

  it('shows rock, slope and water', () => {
    const values = { ...straight, ground: 'soil-over-rock', rockFromFt: 3.5, slopeRiseIn: 5, waterIn: 1.2 };
    const section = setSection(values, { ...derived, waterWithPoleIn: 2.4 });
    expect(section.rockFromFt).toBe(3.5);
    expect(section.slope).toBeCloseTo(0.25, 10);
    expect(section.waterFt).toBeCloseTo(0.2, 10);
    expect(setSection({ ...straight, ground: 'rock' }, derived).rockFromFt).toBe(0);
  });

  it('draws nothing that was not measured, and names it', () => {
    const section = setSection({ ground: 'soil-over-rock', boreTopIn: 20 }, { ...derived, dueFt: null });
    expect(section.bore).toBeNull();
    expect(section.pole).toBeNull();
    expect(section.foam).toBeNull();
    expect(section.missing).toEqual([
      'boreDepthFt',
      'embedmentFt',
      'foamTopBelowGradeIn',
      'waterIn',
      'rockFromFt',
    ]);
  });

  it('gives the wall of a belled bore with its kink', () => {
    const { bore } = setSection({ ...straight, boreBottomIn: 18, bellIn: 36, bellHeightFt: 2 }, derived);
    expect(bore && boreWall(bore, 0, 6)).toEqual([
      { x: 20 / 24, z: 0 },
      { x: 18 / 24, z: 4 },
      { x: 36 / 24, z: 6 },
    ]);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { boreVolume } from './bore-profile.ts';
import { poleSizeAt, poleVolume } from './pole-profile.ts';
import { areaFactor } from './section.ts';
import { setSpace, setVoid, spaceBetween, type SetSpace } from './set-space.ts';

const LEVEL = { foamFollowsGrade: false };
const inches = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Whole records whose bore is wider than their pole everywhere. */
const records = fc.record({
  boreTopIn: inches(18, 40),
  boreTopAcrossIn: inches(18, 40),
  boreBottomIn: inches(18, 40),
  boreBottomAcrossIn: inches(18, 40),
  bell: fc.option(fc.record({ bellIn: inches(20, 60), bellHeightFt: inches(0.2, 3) }), { nil: undefined }),
  boreDepthFt: inches(5, 12),
  bedFt: inches(0.1, 1),
  embedmentFt: inches(3, 12),
  diameterGroundLineIn: inches(6, 15),
  diameterButtIn: inches(6, 15),
  poleSection: fc.constantFrom('round', 'square', 'hexagonal', 'octagonal', 'dodecagonal'),
  buttEnd: fc.constantFrom('solid', 'open'),
  foamTopBelowGradeIn: inches(-6, 24),
});

function spaceOf({ bell, ...record }: typeof records extends fc.Arbitrary<infer T> ? T : never): SetSpace {
  const space = setSpace({ ...record, ...bell, bedMaterial: 'native', wallIn: 0.5 }, LEVEL);
  if (space === null) throw new Error('the record is complete');
  return space;
}

const spaces = records.map(spaceOf);
/** Equal within 1e-9, relative where above one. */
const off = (actual: number, expected: number) =>
  Math.abs(actual - expected) / Math.max(1, Math.abs(expected)) / 1e-9;

/** Areas in ft² written out anew from the readings, apart from the code under test: at `z`, of the stretch that `within` lies in. */
function areaAt(space: SetSpace, z: number, within: number): number {
  const part = space.bore.parts.find(
    ({ fromFt, toFt }) => within >= fromFt && within <= toFt && toFt > fromFt,
  );
  if (part === undefined) return 0;
  const share = (z - part.fromFt) / (part.toFt - part.fromFt);
  const a = part.top.a * (1 - share) + part.bottom.a * share;
  const b = part.top.b * (1 - share) + part.bottom.b * share;
  const { pole } = space;
  const size = pole.groundLineIn + ((pole.buttIn - pole.groundLineIn) * z) / pole.embedmentFt;
  const inside = pole.openWallIn === null ? 0 : size - 2 * pole.openWallIn;
  const poleArea = within <= pole.embedmentFt ? areaFactor(pole.section) * (size ** 2 - inside ** 2) : 0;
  return ((Math.PI / 4) * a * b - poleArea) / 144;
}

/** Simpson's rule between two depths without a break of the profile: exact for areas that are polynomials to the third degree. */
function simpson(space: SetSpace, from: number, to: number): number {
  // The middle says which stretch it is: at its ends a neighbour's area does not count, however short it is.
  const middle = (from + to) / 2;
  const ends = areaAt(space, from, middle) + areaAt(space, to, middle);
  return ((to - from) / 6) * (ends + 4 * areaAt(space, middle, middle));
}

describe('void of a set record', () => {
  test('equals numeric quadrature', () => {
    fc.assert(
      fc.property(spaces, (space) => {
        const top = space.foamTopFt;
        const end = space.foamBottomFt;
        const inner = [...space.bore.parts.map(({ toFt }) => toFt), space.pole.embedmentFt]
          .filter((z) => z > top && z < end)
          .sort((a, b) => a - b);
        const breaks = [top, ...inner, end];
        let expected = 0;
        for (let at = 1; at < breaks.length; at += 1)
          expected += simpson(space, breaks[at - 1] ?? 0, breaks[at] ?? 0);
        expect(off(setVoid(space), expected)).toBeLessThanOrEqual(1);
      }),
    );
  });

  test('is additive when cut at any depth', () => {
    fc.assert(
      fc.property(spaces, inches(0, 1), (space, share) => {
        const end = space.foamBottomFt;
        const cut = end * share;
        expect(
          off(spaceBetween(space, 0, cut) + spaceBetween(space, cut, end), spaceBetween(space, 0, end)),
        ).toBeLessThanOrEqual(1);
        const bore = boreVolume(space.bore, 0, cut) + boreVolume(space.bore, cut, end);
        expect(off(bore, boreVolume(space.bore, 0, end))).toBeLessThanOrEqual(1);
        const pole = poleVolume(space.pole, 0, cut) + poleVolume(space.pole, cut, end);
        expect(off(pole, poleVolume(space.pole, 0, end))).toBeLessThanOrEqual(1);
      }),
    );
  });

  test.each(['boreTopIn', 'boreTopAcrossIn', 'boreBottomIn', 'boreBottomAcrossIn', 'boreDepthFt'] as const)(
    'grows with %s',
    (field) => {
      fc.assert(
        fc.property(records, inches(0.001, 5), (record, more) => {
          const wider = { ...record, [field]: record[field] + more };
          expect(setVoid(spaceOf(wider))).toBeGreaterThanOrEqual(setVoid(spaceOf(record)) - 1e-12);
        }),
      );
    },
  );

  test.each(['diameterGroundLineIn', 'diameterButtIn', 'embedmentFt', 'foamTopBelowGradeIn'] as const)(
    'shrinks with %s of a straight solid pole',
    (field) => {
      fc.assert(
        fc.property(records, inches(0.001, 2), (record, more) => {
          const solid = { ...record, buttEnd: 'solid' as const, poleSection: 'round' as const };
          const straight =
            field === 'embedmentFt' ? { ...solid, diameterButtIn: solid.diameterGroundLineIn } : solid;
          const larger = { ...straight, [field]: straight[field] + more };
          expect(setVoid(spaceOf(larger))).toBeLessThanOrEqual(setVoid(spaceOf(straight)) + 1e-12);
        }),
      );
    },
  );

  test('is never negative, whatever the readings', () => {
    const any = fc.dictionary(
      fc.constantFrom(
        'boreTopIn',
        'boreBottomIn',
        'bellIn',
        'bellHeightFt',
        'boreDepthFt',
        'embedmentFt',
        'bedFt',
        'diameterGroundLineIn',
        'diameterButtIn',
        'foamTopBelowGradeIn',
        'slopeRiseIn',
        'wallIn',
      ),
      fc.oneof(fc.double({ min: -100, max: 100 }), fc.constant(0)),
    );
    fc.assert(
      fc.property(any, (values) => {
        const space = setSpace({ bedMaterial: 'native', ...values }, { foamFollowsGrade: true });
        if (space === null) return;
        const volume = setVoid(space);
        expect(volume).toBeGreaterThanOrEqual(0);
      }),
    );
  });
});

test('an open pole whose wall fills it counts as solid', () => {
  const values = {
    boreTopIn: 20,
    boreDepthFt: 6,
    embedmentFt: 6,
    diameterGroundLineIn: 4,
    diameterButtIn: 4,
    foamTopBelowGradeIn: 0,
  };
  const open = setSpace({ ...values, buttEnd: 'open', wallIn: 2 }, LEVEL);
  const solid = setSpace(values, LEVEL);
  expect(open === null ? null : setVoid(open)).toBe(solid === null ? undefined : setVoid(solid));
});

test('the size of the pole runs straight from ground line to butt', () => {
  const pole = { section: 'round', embedmentFt: 6, groundLineIn: 10, buttIn: 13, openWallIn: null } as const;
  expect([-1, 0, 2, 6, 7].map((z) => poleSizeAt(pole, z))).toEqual([10, 10, 11, 13, 13]);
});

test('a bed of unknown material, or a material of unknown height, leaves the void unknown', () => {
  const values = {
    boreTopIn: 20,
    boreDepthFt: 6.5,
    embedmentFt: 6,
    diameterGroundLineIn: 12,
    diameterButtIn: 12,
    foamTopBelowGradeIn: 0,
  };
  expect(setSpace({ ...values, bedFt: 0.5 }, LEVEL)).toBeNull();
  expect(setSpace({ ...values, bedMaterial: 'native' }, LEVEL)).toBeNull();
  expect(setSpace({ ...values, bedFt: 0 }, LEVEL)).not.toBeNull();
  expect(setSpace({ ...values, buttEnd: 'open' }, LEVEL)).toBeNull();
});

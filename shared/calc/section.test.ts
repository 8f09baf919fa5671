import fc from 'fast-check';
import { expect, test } from 'vitest';
import { acrossCorners, girthFromSize, isSection, sectionArea, sizeFromGirth } from './section.ts';

const SECTIONS = ['round', 'square', 'hexagonal', 'octagonal', 'dodecagonal'] as const;

// Areas and corners of regular polygons, 10 across flats: 100; 50√3; 200(√2 − 1); 300(2 − √3).
test.each([
  ['round', 78.539816, 10, 31.415927],
  ['square', 100, 14.142136, 40],
  ['hexagonal', 86.60254, 11.547005, 34.641016],
  ['octagonal', 82.842712, 10.823922, 33.137085],
  ['dodecagonal', 80.384758, 10.352762, 32.153903],
] as const)('%s, 10 across flats', (section, area, corners, girth) => {
  expect(sectionArea(section, 10)).toBeCloseTo(area, 5);
  expect(acrossCorners(section, 10)).toBeCloseTo(corners, 5);
  expect(girthFromSize(section, 10)).toBeCloseTo(girth, 5);
});

test('girth and size are each other’s reverse', () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...SECTIONS),
      fc.double({ min: 1, max: 100, noNaN: true }),
      (section, size) => {
        expect(sizeFromGirth(section, girthFromSize(section, size))).toBeCloseTo(size, 9);
      },
    ),
  );
});

test('a name of the prototype is no section', () => {
  expect(isSection('constructor')).toBe(false);
  expect(isSection('octagonal')).toBe(true);
});

import { describe, expect, it } from 'vitest';
import { geoAreaOf, isInArea, type GeoArea } from './geo-area.ts';

const square = (from: number, to: number) => [
  [from, from],
  [to, from],
  [to, to],
  [from, to],
  [from, from],
];
const WITH_HOLE = { type: 'Polygon', coordinates: [square(0, 10), square(4, 6)] };
const TWO = { type: 'MultiPolygon', coordinates: [[square(0, 1)], [square(2, 3)]] };
const area = (value: unknown): GeoArea => geoAreaOf(value) ?? [];
const at = (longitude: number, latitude: number) => ({ longitude, latitude });

describe('geoAreaOf', () => {
  it.each([
    ['a feature', { type: 'Feature', geometry: WITH_HOLE }, 1],
    ['two polygons', TWO, 2],
  ])('reads %s', (_name, value, polygons) => {
    expect(geoAreaOf(value)).toHaveLength(polygons);
  });

  it.each([
    ['a point', { type: 'Point', coordinates: [1, 2] }],
    [
      'two corners',
      {
        type: 'Polygon',
        coordinates: [
          [
            [0, 0],
            [1, 1],
          ],
        ],
      },
    ],
    [
      'no numbers',
      {
        type: 'Polygon',
        coordinates: [
          [
            ['a', 0],
            [1, 1],
            [2, 0],
          ],
        ],
      },
    ],
    ['no rings', { type: 'Polygon', coordinates: [] }],
    ['no coordinates', { type: 'Polygon' }],
    ['a feature without a geometry', { type: 'Feature' }],
    ['nothing', null],
    ['a text', 'Polygon'],
  ])('is null for %s', (_name, value) => {
    expect(geoAreaOf(value)).toBeNull();
  });
});

describe('isInArea', () => {
  it.each([
    ['inside', WITH_HOLE, at(2, 2), true],
    ['outside', WITH_HOLE, at(11, 2), false],
    ['in the hole', WITH_HOLE, at(5, 5), false],
    ['on the rim of the hole', WITH_HOLE, at(4, 5), true],
    ['on the boundary', WITH_HOLE, at(10, 3), true],
    ['on a corner', WITH_HOLE, at(0, 0), true],
    ['level with a corner, outside', WITH_HOLE, at(-1, 10), false],
    ['in the second of two', TWO, at(2.5, 2.5), true],
    ['between two', TWO, at(1.5, 1.5), false],
  ])('%s', (_name, value, place, inside) => {
    expect(isInArea(area(value), place)).toBe(inside);
  });
});

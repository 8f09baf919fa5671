import { describe, expect, it } from 'vitest';
import { namedPoints, projectPositions, roundLength } from './project-positions.ts';

const BOX = { width: 220, height: 220, pad: 10 };

describe('projectPositions', () => {
  it('has north up, and a foot east as long as a foot north', () => {
    // At 60° a degree of longitude is half a degree of latitude (cos 60° = 0.5).
    const plot = projectPositions(
      [
        { latitude: 59.99, longitude: 10 },
        { latitude: 60.01, longitude: 10.04 },
      ],
      BOX,
    );
    expect(plot?.points.map(({ x, y }) => [Math.round(x), Math.round(y)])).toEqual([
      [10, 210],
      [210, 10],
    ]);
    // A degree of latitude is 364 813 ft on the mean sphere (π ÷ 180 × 20 902 260 ft); 0.02 of it.
    expect(plot?.heightFt).toBeCloseTo(7296.3, 0);
  });

  it('goes the short way over the date line', () => {
    const plot = projectPositions(
      [
        { latitude: 0, longitude: 179.99 },
        { latitude: 0, longitude: -179.99 },
      ],
      BOX,
    );
    expect(plot?.points.map(({ x }) => Math.round(x))).toEqual([10, 210]);
  });

  it('puts one place in the middle, and nothing for none', () => {
    expect(projectPositions([{ latitude: 44, longitude: -90 }], BOX)?.points[0]).toMatchObject({
      x: 110,
      y: 110,
    });
    expect(projectPositions([], BOX)).toBeNull();
  });
});

describe('roundLength', () => {
  it.each([
    [1, 1],
    [19, 10],
    [49.9, 20],
    [730, 500],
  ])('%d -> %d', (most, length) => expect(roundLength(most)).toBe(length));
});

it('a name that would cover one before it is left out', () => {
  const at = (item: string, x: number, y: number) => ({ item, x, y });
  const named = namedPoints([at('a', 0, 0), at('b', 30, 4), at('c', 60, 0), at('d', 30, 20)], {
    width: 50,
    height: 15,
  });
  expect([...named]).toEqual(['a', 'c', 'd']);
});

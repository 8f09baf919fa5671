import type { Paint } from './marks.ts';

export type Material = 'soil' | 'rock' | 'foam' | 'stone';

/** A tile that repeats over an area: thin lines, rings and dots of one colour, on a ground of its own or on none. */
export type Tile = {
  readonly width: number;
  readonly height: number;
  readonly ground: Paint | null;
  readonly paint: Paint;
  readonly weight: number;
  readonly opacity: number;
  /** Each a line through points `[x, y, x, y …]`. */
  readonly lines: readonly (readonly number[])[];
  /** `[x, y, r]`. */
  readonly rings: readonly (readonly [number, number, number])[];
  readonly dots: readonly (readonly [number, number, number])[];
};

/** Soil: lines at 45 degrees, 9 units apart; each tile carries its corners' share of its neighbours' lines. */
const SOIL_STEP = 12.73;

export const TILES: Readonly<Record<Material, Tile>> = {
  soil: {
    width: SOIL_STEP,
    height: SOIL_STEP,
    ground: null,
    paint: 'soil',
    weight: 0.8,
    opacity: 0.75,
    lines: [
      [0, SOIL_STEP, SOIL_STEP, 0],
      [-1, 1, 1, -1],
      [SOIL_STEP - 1, SOIL_STEP + 1, SOIL_STEP + 1, SOIL_STEP - 1],
    ],
    rings: [],
    dots: [],
  },
  rock: {
    width: 26,
    height: 22,
    ground: null,
    paint: 'rock',
    weight: 0.8,
    opacity: 0.6,
    lines: [
      [0, 4, 7, 0],
      [0, 4, 6, 12, 0, 22],
      [6, 12, 17, 9, 26, 4],
      [17, 9, 14, 0],
      [17, 9, 21, 19, 14, 22],
      [21, 19, 26, 22],
    ],
    rings: [],
    dots: [],
  },
  foam: {
    width: 15,
    height: 15,
    ground: 'foam',
    paint: 'foam-cell',
    weight: 1.1,
    opacity: 0.8,
    lines: [],
    rings: [[4, 4, 2.1]],
    dots: [
      [11.5, 11.5, 1.2],
      [11, 3.5, 0.85],
      [4, 11, 0.9],
    ],
  },
  stone: {
    width: 13,
    height: 11,
    ground: 'sunk',
    paint: 'rock',
    weight: 0.9,
    opacity: 1,
    lines: [
      [1, 3, 3.5, 1, 6.5, 1.5, 7, 5, 4, 6.5, 1.5, 5.5, 1, 3],
      [8, 7.5, 10, 5.5, 12.5, 6.5, 12.5, 10, 9, 10.5, 8, 7.5],
    ],
    rings: [],
    dots: [],
  },
};

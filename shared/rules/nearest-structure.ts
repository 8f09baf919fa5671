import { geodesicDistanceM, type Place } from '#shared/calc/geodesic-distance.ts';
import { mToFt } from '#shared/units/convert.ts';

/** A structure as a point with how well it is known. `T` is whatever it stands for. */
export type Point<T> = {
  readonly place: Place;
  readonly accuracyFt: number;
  readonly of: T;
};
export type Near<T> = {
  readonly other: T;
  /** Distance less both accuracies, never below zero, ft. */
  readonly apartFt: number;
  readonly distanceFt: number;
};

/** A degree of latitude is nowhere shorter (110,574 m at the equator, WGS 84). */
const FT_PER_DEGREE = 360_000;
/** Nearer to a pole of the globe a degree of longitude is next to nothing: everything counts as near by longitude. */
const LEAST_COSINE = 1e-3;

type Grid<T> = {
  readonly cells: ReadonlyMap<string, readonly Point<T>[]>;
  readonly indexOf: (place: Place) => readonly [number, number];
};

const gridOf = <T>(points: readonly Point<T>[], reachFt: number): Grid<T> => {
  const highest = points.reduce((most, { place }) => Math.max(most, Math.abs(place.latitude)), 0);
  const step = reachFt / FT_PER_DEGREE;
  const across = step / Math.max(Math.cos((highest * Math.PI) / 180), LEAST_COSINE);
  const indexOf = ({ latitude, longitude }: Place) =>
    [Math.floor(latitude / step), Math.floor(longitude / across)] as const;
  const cells = new Map<string, Point<T>[]>();
  for (const point of points) {
    const key = indexOf(point.place).join('|');
    const cell = cells.get(key);
    if (cell) cell.push(point);
    else cells.set(key, [point]);
  }
  return { cells, indexOf };
};

/** Looks for the nearest other structure within a distance; linear in the points where they do not lie in heaps. */
export const nearestStructure = <T>(
  points: readonly Point<T>[],
  withinFt: number,
): ((point: Point<T>, isOther: (other: T) => boolean) => Near<T> | null) => {
  const widest = points.reduce((most, { accuracyFt }) => Math.max(most, accuracyFt), 0);
  const reachFt = withinFt + 2 * widest;
  if (!(reachFt > 0)) return () => null;
  const { cells, indexOf } = gridOf(points, reachFt);
  return (point, isOther) => {
    const [row, column] = indexOf(point.place);
    let nearest: Near<T> | null = null;
    for (let i = row - 1; i <= row + 1; i += 1) {
      for (let j = column - 1; j <= column + 1; j += 1) {
        for (const other of cells.get(`${i}|${j}`) ?? []) {
          if (!isOther(other.of)) continue;
          const metres = geodesicDistanceM(point.place, other.place);
          if (metres === null) continue;
          const distanceFt = mToFt(metres);
          const apartFt = Math.max(0, distanceFt - point.accuracyFt - other.accuracyFt);
          // The nearer by distance where accuracies swallow both, so that the order of points has no say.
          const nearer =
            nearest === null ||
            apartFt < nearest.apartFt ||
            (apartFt === nearest.apartFt && distanceFt < nearest.distanceFt);
          if (nearer) nearest = { other: other.of, apartFt, distanceFt };
          // Nothing is nearer, and thousands may have been given the very same place.
          if (distanceFt === 0) return nearest;
        }
      }
    }
    return nearest;
  };
};

/** Feet of a degree of latitude on a sphere of the earth's mean radius (6 371 008.8 m): good to 0.6 %, enough for a plot. */
const FEET_A_DEGREE = (Math.PI / 180) * (6_371_008.8 / 0.3048);

export type Position = { readonly latitude: number; readonly longitude: number };
export type Plot<T> = {
  readonly points: readonly { readonly x: number; readonly y: number; readonly item: T }[];
  /** Feet of one pixel. */
  readonly feetPerPx: number;
  readonly widthFt: number;
  readonly heightFt: number;
};

/**
 * Scales positions into a box, north up, one scale both ways: longitudes are shortened by the cosine of the middle
 * latitude, so that a foot east is as long as a foot north.
 * @param box in px; `pad` stays free on every side. @returns null without positions
 */
export function projectPositions<T extends Position>(
  items: readonly T[],
  box: { readonly width: number; readonly height: number; readonly pad: number },
): Plot<T> | null {
  const first = items[0];
  if (!first) return null;
  const latitudes = items.map((item) => item.latitude);
  // Across the date line the short way round is taken.
  const longitudes = items.map((item) => first.longitude + turn(item.longitude - first.longitude));
  const [south, north] = range(latitudes);
  const [west, east] = range(longitudes);
  const eastFt = FEET_A_DEGREE * Math.cos((((south + north) / 2) * Math.PI) / 180);
  const widthFt = (east - west) * eastFt;
  const heightFt = (north - south) * FEET_A_DEGREE;
  const roomX = Math.max(1, box.width - 2 * box.pad);
  const roomY = Math.max(1, box.height - 2 * box.pad);
  // One place alone, or all in one: the plot then spans 100 ft.
  const feetPerPx = Math.max(widthFt / roomX, heightFt / roomY) || 100 / roomX;
  return {
    points: items.map((item, index) => ({
      x: box.width / 2 + (((longitudes[index] ?? west) - (west + east) / 2) * eastFt) / feetPerPx,
      y: box.height / 2 - ((item.latitude - (south + north) / 2) * FEET_A_DEGREE) / feetPerPx,
      item,
    })),
    feetPerPx,
    widthFt,
    heightFt,
  };
}

/** Which points can carry a name that does not cover the name of one before it. */
export function namedPoints<T>(
  points: readonly { readonly x: number; readonly y: number; readonly item: T }[],
  room: { readonly width: number; readonly height: number },
): ReadonlySet<T> {
  const kept: { x: number; y: number; item: T }[] = [];
  for (const point of points) {
    const free = kept.every(
      (other) => Math.abs(other.x - point.x) >= room.width || Math.abs(other.y - point.y) >= room.height,
    );
    if (free) kept.push(point);
  }
  return new Set(kept.map((point) => point.item));
}

/** The longest of 1, 2, 5 × 10ⁿ that is no longer than `most`. */
export function roundLength(most: number): number {
  const power = 10 ** Math.floor(Math.log10(most));
  return ([5, 2, 1].find((step) => step * power <= most) ?? 1) * power;
}

function turn(degrees: number): number {
  return ((((degrees + 180) % 360) + 360) % 360) - 180;
}

function range(values: readonly number[]): [number, number] {
  return values.reduce<[number, number]>(
    ([low, high], value) => [Math.min(low, value), Math.max(high, value)],
    [Infinity, -Infinity],
  );
}

/** A ring of [longitude, latitude] pairs, first and last the same or not. */
type Ring = readonly (readonly [number, number])[];

/** Polygons of GeoJSON (RFC 7946): each an outer ring, then its holes. */
export type GeoArea = readonly (readonly Ring[])[];

const isPair = (value: unknown): value is [number, number] =>
  Array.isArray(value) && value.length >= 2 && value.slice(0, 2).every((one) => Number.isFinite(one));

const ringOf = (value: unknown): Ring | null =>
  Array.isArray(value) && value.length >= 3 && value.every(isPair) ? value : null;

const polygonOf = (value: unknown): readonly Ring[] | null => {
  if (!Array.isArray(value) || value.length === 0) return null;
  const rings = value.map(ringOf);
  return rings.every((ring) => ring !== null) ? rings : null;
};

/** A GeoJSON Polygon or MultiPolygon, bare or as a Feature; null for anything else. */
export function geoAreaOf(value: unknown): GeoArea | null {
  if (value === null || typeof value !== 'object' || !('type' in value)) return null;
  if (value.type === 'Feature') return 'geometry' in value ? geoAreaOf(value.geometry) : null;
  if (!('coordinates' in value)) return null;
  const { type, coordinates } = value;
  const parts = type === 'Polygon' ? [coordinates] : type === 'MultiPolygon' ? coordinates : null;
  if (!Array.isArray(parts) || parts.length === 0) return null;
  const polygons = parts.map(polygonOf);
  return polygons.every((polygon) => polygon !== null) ? polygons : null;
}

/** Is the point on the straight line between two corners, within the last digits? */
const onEdge = (
  [x, y]: readonly [number, number],
  [x1, y1]: readonly [number, number],
  [x2, y2]: readonly [number, number],
): boolean => {
  const cross = (x - x1) * (y2 - y1) - (y - y1) * (x2 - x1);
  const within = (x - x1) * (x - x2) <= 0 && (y - y1) * (y - y2) <= 0;
  return within && Math.abs(cross) <= 1e-15;
};

/** Even-odd; the boundary counts as inside. */
const inRing = (point: readonly [number, number], ring: Ring): 'in' | 'out' | 'edge' => {
  const [x, y] = point;
  let inside = false;
  let [x1, y1] = ring.at(-1) ?? [0, 0];
  for (const [x2, y2] of ring) {
    if (onEdge(point, [x1, y1], [x2, y2])) return 'edge';
    if (y1 > y !== y2 > y && x < ((x2 - x1) * (y - y1)) / (y2 - y1) + x1) inside = !inside;
    [x1, y1] = [x2, y2];
  }
  return inside ? 'in' : 'out';
};

/** Is a place inside an area, its boundary counted? Edges are straight in degrees, as RFC 7946 has them; none crosses the antimeridian. */
export function isInArea(
  area: GeoArea,
  { latitude, longitude }: { readonly latitude: number; readonly longitude: number },
): boolean {
  const point = [longitude, latitude] as const;
  return area.some(([outer, ...holes]) => {
    if (outer === undefined || inRing(point, outer) === 'out') return false;
    return holes.every((hole) => inRing(point, hole) !== 'in');
  });
}

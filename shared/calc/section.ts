/** A pole's cross-section. Its size is the diameter if round, across flats if a regular polygon. */
export const SECTION_SIDES = { round: null, square: 4, hexagonal: 6, octagonal: 8, dodecagonal: 12 } as const;
export type Section = keyof typeof SECTION_SIDES;

export function isSection(text: string): text is Section {
  return Object.hasOwn(SECTION_SIDES, text);
}

/** Area over size squared: π/4 for a circle, (n/4)·tan(π/n) for a regular n-gon across flats. */
export function areaFactor(section: Section): number {
  const n = SECTION_SIDES[section];
  return n === null ? Math.PI / 4 : (n / 4) * Math.tan(Math.PI / n);
}

/** Area of a section by its size, in the size's unit squared. */
export function sectionArea(section: Section, size: number): number {
  return areaFactor(section) * size * size;
}

/** Size from the girth by tape: C/π, or C/(n·tan(π/n)). */
export function sizeFromGirth(section: Section, girth: number): number {
  const n = SECTION_SIDES[section];
  return n === null ? girth / Math.PI : girth / (n * Math.tan(Math.PI / n));
}

/** Girth from the size, the reverse. */
export function girthFromSize(section: Section, size: number): number {
  const n = SECTION_SIDES[section];
  return n === null ? size * Math.PI : size * n * Math.tan(Math.PI / n);
}

/** Widest size, corner to corner for a polygon. */
export function acrossCorners(section: Section, size: number): number {
  const n = SECTION_SIDES[section];
  if (n === null) return size;
  // Every section here has an even number of sides, so a corner faces a corner.
  return size / Math.cos(Math.PI / n);
}

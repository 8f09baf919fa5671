import type { Paint } from '#shared/drawing/marks.ts';

/** Written out, so that the style sheet is made with them. */
export const FILL: Record<Paint, string> = {
  sheet: 'fill-sheet',
  sunk: 'fill-sunk',
  ink: 'fill-ink',
  'ink-2': 'fill-ink-2',
  muted: 'fill-muted',
  conform: 'fill-conform',
  nonconform: 'fill-nonconform',
  query: 'fill-query',
  concession: 'fill-concession',
  pole: 'fill-pole',
  'pole-fill': 'fill-pole-fill',
  foam: 'fill-foam',
  'foam-cell': 'fill-foam-cell',
  water: 'fill-water',
  'water-fill': 'fill-water-fill',
  soil: 'fill-soil',
  rock: 'fill-rock',
};

export const STROKE: Record<Paint, string> = {
  sheet: 'stroke-sheet',
  sunk: 'stroke-sunk',
  ink: 'stroke-ink',
  'ink-2': 'stroke-ink-2',
  muted: 'stroke-muted',
  conform: 'stroke-conform',
  nonconform: 'stroke-nonconform',
  query: 'stroke-query',
  concession: 'stroke-concession',
  pole: 'stroke-pole',
  'pole-fill': 'stroke-pole-fill',
  foam: 'stroke-foam',
  'foam-cell': 'stroke-foam-cell',
  water: 'stroke-water',
  'water-fill': 'stroke-water-fill',
  soil: 'stroke-soil',
  rock: 'stroke-rock',
};

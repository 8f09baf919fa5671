import type { ColourName } from './light-colours.ts';
import type { Material } from './materials.ts';
import type { Run, SheetFinding } from './sheet-types.ts';

/** Colours that a drawing uses, by the names of the tokens. */
export type Paint = Exclude<ColourName, 'paper' | 'hairline' | 'rule' | 'focus' | 'accent' | 'on-accent'>;

/** A line or an area, in the commands of an SVG path (which a PDF writer reads too). */
export type PathMark = {
  readonly is: 'path';
  readonly d: string;
  readonly fill?: Paint;
  /** Hatched or celled; drawn over `fill`. */
  readonly material?: Material;
  readonly stroke?: Paint;
  readonly weight?: number;
  readonly dash?: readonly number[];
  /** Of fill and stroke. */
  readonly opacity?: number;
  /** Leads from a finding's balloon: heavier while that is marked. */
  readonly finding?: string;
  /** A dimension's own lines, so that it can be tested that none runs through another's words. */
  readonly part?: string;
};

/** One line of words. */
export type TextMark = {
  readonly is: 'text';
  readonly x: number;
  /** Baseline. */
  readonly y: number;
  readonly runs: readonly Run[];
  readonly size: number;
  readonly anchor: 'start' | 'middle' | 'end';
  /** Upwards along a vertical dimension, about (x, y). */
  readonly upright?: boolean;
  /** A rim of paper keeps hatching off the words. */
  readonly halo?: boolean;
  /** Space between letters. */
  readonly spacing?: number;
  readonly part: string;
};

/** The number of a finding in its circle. */
export type BalloonMark = {
  readonly is: 'balloon';
  readonly x: number;
  readonly y: number;
  readonly finding: SheetFinding;
};

/** What a drawing is made of, back to front, in sheet units: the same for the screen and for a PDF. */
export type Mark = PathMark | TextMark | BalloonMark;

type Style = Omit<PathMark, 'is' | 'd'>;

export function path(d: string, style: Style): PathMark {
  return { is: 'path', d, ...style };
}

const HEAD = 8.5;
const HALF = 2.9;

/** Arrowhead with its point at (x, y). */
export function arrow(
  x: number,
  y: number,
  { to, part }: { to: 'up' | 'down' | 'left' | 'right'; part: string },
): PathMark {
  const [dx, dy] = { up: [0, -1], down: [0, 1], left: [-1, 0], right: [1, 0] }[to] as [number, number];
  const foot = { x: x - dx * HEAD, y: y - dy * HEAD };
  const side = { x: dy * HALF, y: dx * HALF };
  return path(
    `M${at(x, y)}L${at(foot.x + side.x, foot.y + side.y)}L${at(foot.x - side.x, foot.y - side.y)}Z`,
    { fill: 'ink', part },
  );
}

/** A circle as a path. */
export function circle(x: number, y: number, r: number): string {
  return `M${at(x - r, y)}A${r} ${r} 0 1 0 ${at(x + r, y)}A${r} ${r} 0 1 0 ${at(x - r, y)}Z`;
}

/** `12.5 40`: a place, to a hundredth of a unit, which is finer than any screen. */
export function at(x: number, y: number): string {
  return `${round(x)} ${round(y)}`;
}

export function round(value: number): number {
  return Math.round(value * 100) / 100;
}

/** Line through the points; closed: back to the first. */
export function through(points: readonly { x: number; y: number }[], closed = false): string {
  const line = points.map((point, index) => `${index === 0 ? 'M' : 'L'}${at(point.x, point.y)}`).join('');
  return closed && line !== '' ? `${line}Z` : line;
}

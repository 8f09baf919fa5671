import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';
import type { Mark } from './marks.ts';
import { readBoxes } from './mark-boxes.ts';
import type { Box, Point, SheetFinding, SheetPour, TitleBlockData } from './sheet-types.ts';

export const NO_FIGURES: Derived = {
  voidFt3: null,
  placedFt3: null,
  fillRatio: null,
  fillRatioU: null,
  dueFt: null,
  waterWithPoleIn: null,
  leastAnnulusIn: null,
  poleTaped: null,
  worstReading: null,
};

export const TITLE: TitleBlockData = {
  owner: 'Larkmoor Electric Cooperative',
  workOrder: '17',
  structure: '17-0417',
  kind: 'Set, soil',
  pole: '40 ft class 4, pine',
  measuredOn: '14 Apr 2026, 10:42',
  standard: '3',
  revision: '1',
  decided: 'not yet',
  sheet: '6 of 38',
};

export type GridRecord = {
  readonly kind: Kind;
  readonly values: FieldValues;
  readonly derived: Derived;
  readonly pours?: readonly SheetPour[];
};

/** Numbers in an order that is always the same (Lehmer, a = 48271, m = 2³¹ − 1). */
export function fixedNumbers(seed: number): (from: number, to: number) => number {
  let state = seed;
  return (from, to) => {
    state = (state * 48271) % 2147483647;
    return Math.round((from + ((to - from) * state) / 2147483647) * 100) / 100;
  };
}

const FIELDS: Readonly<Record<Kind, readonly (string | null)[]>> = {
  set: ['embedmentFt', 'waterIn', 'hardwareAt', 'quantity', 'boreDepthFt', 'latitude', 'leastGapIn', null],
  straighten: ['leanAfterInPer10Ft', 'gapDepthFt', 'waterIn', 'releasedAt', 'gapAtGradeIn', null],
  relevel: ['gap3In', 'slopeAfterAcrossInPerFt', 'padLengthIn', 'loweredAt', 'lot', null],
};
const TITLES = ['Embedment short', 'Water too deep with the pole in the bore', 'Hardware too early'];

/** Findings as a check would give them. */
export function someFindings(kind: Kind, count: number): SheetFinding[] {
  return FIELDS[kind].slice(0, count).map((field, index) => ({
    id: String(index),
    number: index + 1,
    code: `code-${index}`,
    title: TITLES[index % 3] ?? '',
    severity: index % 2 === 0 ? 'nonconformity' : 'query',
    field,
    measured: 5.8,
    limit: 6,
    margin: -0.2,
    unit: 'ft',
  }));
}

function meet(a: Box, b: Box): boolean {
  const touch = 0.01;
  return (
    a.x + touch < b.x + b.width &&
    b.x + touch < a.x + a.width &&
    a.y + touch < b.y + b.height &&
    b.y + touch < a.y + a.height
  );
}

/** Words and balloons that lie over one another. Lines of one label stand close and belong together. */
export function overlaps(marks: readonly Mark[]): string[] {
  const boxes = readBoxes(marks);
  return boxes.flatMap((a, index) =>
    boxes
      .slice(index + 1)
      .filter((b) => a.id.split(':')[0] !== b.id.split(':')[0] && meet(a, b))
      .map((b) => `${a.id} over ${b.id}`),
  );
}

export function outside(
  marks: readonly Mark[],
  { width, height }: { width: number; height: number },
): string[] {
  return readBoxes(marks)
    .filter(
      (box) => box.x < 1 || box.y < 1 || box.x + box.width > width - 1 || box.y + box.height > height - 1,
    )
    .map((box) => box.id);
}

type Segment = { readonly part: string; readonly from: Point; readonly to: Point };

/** The straight lines of dimensions: their paths are moves and lines alone. */
function segments(marks: readonly Mark[]): Segment[] {
  return marks.flatMap((mark) => {
    if (mark.is !== 'path' || mark.part === undefined || !mark.stroke) return [];
    const { part } = mark;
    return mark.d
      .split('M')
      .slice(1)
      .flatMap((line) => {
        const points = line.split('L').map((text) => {
          const [x = Number.NaN, y = Number.NaN] = text.split(' ').map(Number);
          return { x, y };
        });
        return points.slice(1).map((to, index) => ({ part, from: points[index] ?? to, to }));
      });
  });
}

/** Dimension lines that run through the words of another dimension, or along its lines. */
export function crossedDimensions(marks: readonly Mark[]): string[] {
  const lines = segments(marks);
  const words = readBoxes(marks).filter((box) => /^(dimension|due)/.test(box.id));
  const through = words.flatMap((box) =>
    lines
      .filter((line) => !box.id.startsWith(`${line.part}:`) && cuts(line, box))
      .map((line) => `${line.part} through ${box.id}`),
  );
  const along = lines.flatMap((a, index) =>
    lines
      .slice(index + 1)
      .filter((b) => a.part !== b.part && onOneAnother(a, b))
      .map((b) => `${a.part} along ${b.part}`),
  );
  return [...through, ...along];
}

/** Level or upright lines: a box of no width is enough. */
function cuts({ from, to }: Segment, box: Box): boolean {
  const line = {
    id: '',
    x: Math.min(from.x, to.x) - 0.2,
    y: Math.min(from.y, to.y) - 0.2,
    width: Math.abs(to.x - from.x) + 0.4,
    height: Math.abs(to.y - from.y) + 0.4,
  };
  return meet(line, box);
}

/** Upright lines less than a unit apart that run side by side: depths. Extension lines hang apart or are one line. */
function onOneAnother(a: Segment, b: Segment): boolean {
  if (/(butt|bore-bottom|bell|bore-top|gap)$/.test(a.part)) return false;
  const upright = (one: Segment) => one.from.x === one.to.x;
  if (!upright(a) || !upright(b) || Math.abs(a.from.x - b.from.x) > 1) return false;
  const [a1, a2] = [Math.min(a.from.y, a.to.y), Math.max(a.from.y, a.to.y)];
  const [b1, b2] = [Math.min(b.from.y, b.to.y), Math.max(b.from.y, b.to.y)];
  return Math.min(a2, b2) - Math.max(a1, b1) > 1;
}

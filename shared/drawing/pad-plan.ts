import { dimensionText } from './dimension-text.ts';
import { GHOST } from './draw-ghosts.ts';
import { contourStepIn, gapContours } from './gap-contours.ts';
import { arrow, at, path, through, type Mark } from './marks.ts';
import { cornerMarks } from './pad-corners.ts';
import type { RelevelLayout } from './relevel-layout.ts';
import type { RelevelPlaces } from './relevel-places.ts';
import type { RelevelSection } from './relevel-section.ts';
import { FONT } from './sheet-spec.ts';
import type { Run } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** The pad from above: foam with contours of its gap, opening, corners with their gaps, its two sizes, the side of the doors. */
export function padPlanMarks(
  { section, places, balloons }: Pick<RelevelLayout, 'section' | 'places' | 'balloons'>,
  metric: boolean,
): Mark[] {
  const { left, right, backY, frontY } = places;
  const known = section.lengthIn !== null && section.widthIn !== null;
  const outline = `M${at(left, backY)}L${at(right, backY)}L${at(right, frontY)}L${at(left, frontY)}Z`;
  const step = section.gapsIn === null ? null : contourStepIn(section.gapsIn);
  // Below the figures that stand under the corners.
  const doorsY = frontY + (places.compact ? 25 : 8);
  const titleX = places.compact ? 12 : Math.min(left, TITLE_X);
  const title = places.compact
    ? 'Plan; gaps at the final level'
    : 'Plan, from above; gaps at the final level';
  return [
    text('plan title', { x: titleX, y: backY - 56, runs: [{ text: title, tone: 'muted' }] }),
    ...(step === null
      ? []
      : [
          text('contours', {
            x: titleX,
            y: backY - 40,
            runs: [
              {
                text: `${places.compact ? 'contours' : 'lines of equal gap'} every ${dimensionStep(step, metric)}`,
                tone: 'muted',
              },
            ],
          }),
        ]),
    path(outline, known ? { material: 'foam' } : {}),
    ...contours(section, places),
    ...(section.opening ? opening(section.opening, places) : []),
    path(outline, known ? { stroke: 'ink', weight: 1.8 } : GHOST),
    ...cornerMarks(section, { places, balloons, metric }),
    ...(places.compact ? [] : sizes(section, places, metric)),
    path(`M${at(left + 4, doorsY)}L${at(right - 4, doorsY)}`, { stroke: 'ink', weight: 2.6 }),
    text('doors', {
      x: (left + right) / 2,
      y: doorsY + (places.compact ? 17 : 28),
      anchor: 'middle',
      runs: [
        { text: 'doors', bold: true },
        { text: ' front', tone: 'muted' },
      ],
    }),
  ];
}

/** Where the words above a wide plan begin; a narrow pad stands in the middle below them. */
const TITLE_X = 138;

type Words = {
  readonly x: number;
  readonly y: number;
  readonly runs: readonly Run[];
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly upright?: boolean;
};

export function text(part: string, { anchor = 'start', ...words }: Words): Mark {
  return { is: 'text', size: FONT, halo: true, part, anchor, ...words };
}

/** Quarters of an inch are written out: one decimal would make 0.25 look like 0.3. */
function dimensionStep(stepIn: number, metric: boolean): string {
  return metric ? dimensionText(stepIn, 'in', true) : `${stepIn}\u00a0in`;
}

function contours({ gapsIn }: RelevelSection, { left, right, backY, frontY }: RelevelPlaces): Mark[] {
  if (gapsIn === null) return [];
  return gapContours(gapsIn).map(({ points }) =>
    path(
      through(points.map(({ u, v }) => ({ x: left + (right - left) * u, y: frontY + (backY - frontY) * v }))),
      { stroke: 'ink-2', weight: 1, dash: [2, 3] },
    ),
  );
}

function opening(
  { lengthIn, widthIn }: { lengthIn: number; widthIn: number },
  { left, right, backY, frontY, scale }: RelevelPlaces,
): Mark[] {
  const x = (left + right) / 2;
  const y = (backY + frontY) / 2;
  const w = Math.min(widthIn * scale, right - left) / 2;
  const h = Math.min(lengthIn * scale, frontY - backY) / 2;
  const fits = textWidth('opening', FONT, true) + 8 <= 2 * w && 2 * h >= 20;
  return [
    path(`M${at(x - w, y - h)}L${at(x + w, y - h)}L${at(x + w, y + h)}L${at(x - w, y + h)}Z`, {
      fill: 'sheet',
      stroke: 'ink',
      weight: 1.4,
      dash: [6, 4],
    }),
    ...(fits
      ? [text('opening', { x, y: y - 2, anchor: 'middle', runs: [{ text: 'opening', bold: true }] })]
      : []),
  ];
}

/** Width above the plan, length at its left, each between extension lines. */
function sizes(
  { lengthIn, widthIn }: RelevelSection,
  { left, right, backY, frontY }: RelevelPlaces,
  metric: boolean,
): Mark[] {
  const marks: Mark[] = [];
  const style = { stroke: 'ink-2', weight: 0.9 } as const;
  if (widthIn !== null) {
    const part = 'dimension width';
    const y = backY - 16;
    marks.push(
      path(`M${at(left, backY - 6)}L${at(left, y - 5)}M${at(right, backY - 6)}L${at(right, y - 5)}`, {
        ...style,
        part,
      }),
      path(`M${at(left, y)}L${at(right, y)}`, { ...style, part }),
      arrow(left, y, { to: 'left', part }),
      arrow(right, y, { to: 'right', part }),
      text(part, {
        x: (left + right) / 2,
        y: y - 5,
        anchor: 'middle',
        runs: [{ text: dimensionText(widthIn, 'in', metric), bold: true }],
      }),
    );
  }
  if (lengthIn !== null) {
    const part = 'dimension length';
    const x = left - 18;
    marks.push(
      path(`M${at(left - 6, backY)}L${at(x - 5, backY)}M${at(left - 6, frontY)}L${at(x - 5, frontY)}`, {
        ...style,
        part,
      }),
      path(`M${at(x, backY)}L${at(x, frontY)}`, { ...style, part }),
      arrow(x, backY, { to: 'up', part }),
      arrow(x, frontY, { to: 'down', part }),
      text(part, {
        x: x - 6,
        y: (backY + frontY) / 2,
        anchor: 'middle',
        upright: true,
        runs: [{ text: dimensionText(lengthIn, 'in', metric), bold: true }],
      }),
    );
  }
  return marks;
}

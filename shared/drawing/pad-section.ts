import { dimensionText } from './dimension-text.ts';
import { GHOST } from './draw-ghosts.ts';
import { arrow, at, path, type Mark } from './marks.ts';
import { text } from './pad-plan.ts';
import { BOX, PAD, type RelevelPlaces } from './relevel-places.ts';
import type { RelevelSection } from './relevel-section.ts';

/** Section from left to right: the pad where it stands now, its slope before as a dashed line, the wedge under it. */
export function padSectionMarks(section: RelevelSection, places: RelevelPlaces, metric: boolean): Mark[] {
  const { left, right, padLeftY, padRightY, deepLeftY, deepRightY } = places;
  const { gapsIn } = section;
  const ground = Math.max(deepLeftY, deepRightY) + 44;
  return [
    text('section title', {
      x: places.compact ? 12 : Math.min(left, 138),
      y: Math.min(padLeftY, padRightY) - PAD - BOX - 12,
      runs: [{ text: 'Section, left to right', tone: 'muted' }],
    }),
    path(
      `M${at(left - 28, deepLeftY)}L${at(left, deepLeftY)}L${at(right, deepRightY)}L${at(right + 28, deepRightY)}L${at(right + 28, ground)}L${at(left - 28, ground)}Z`,
      { material: 'soil' },
    ),
    path(
      `M${at(left, padLeftY)}L${at(right, padRightY)}L${at(right, gapsIn ? deepRightY : padRightY + 16)}L${at(left, gapsIn ? deepLeftY : padLeftY + 16)}Z`,
      gapsIn ? { fill: 'sheet', material: 'foam', stroke: 'ink', weight: 1.4 } : { fill: 'sheet', ...GHOST },
    ),
    box(places, { from: 0, to: 1, above: 0, height: PAD, fill: 'sunk' }),
    box(places, { from: 0.12, to: 0.88, above: PAD, height: BOX, fill: 'sheet' }),
    ...before(section, places),
    ...(gapsIn ? depths(gapsIn, places, metric) : []),
  ];
}

/** A part of the pad between two shares of its width, sloping with it. */
function box(
  { left, right, padLeftY, padRightY }: RelevelPlaces,
  {
    from,
    to,
    above,
    height,
    fill,
  }: { from: number; to: number; above: number; height: number; fill: 'sunk' | 'sheet' },
): Mark {
  const corner = (share: number, up: number) =>
    at(left + (right - left) * share, padLeftY + (padRightY - padLeftY) * share - up);
  return path(
    `M${corner(from, above)}L${corner(to, above)}L${corner(to, above + height)}L${corner(from, above + height)}Z`,
    { fill, stroke: 'ink', weight: 1.4 },
  );
}

/** How the top of the pad ran before, about its middle; a slope that would leave the drawing is cut at its edge. */
function before({ slopes }: RelevelSection, { left, right, padY }: RelevelPlaces): Mark[] {
  if (slopes.beforeAcross === null) return [];
  const rise = Math.max(-60, Math.min(60, (slopes.beforeAcross / 12) * (right - left)));
  const middle = padY - PAD / 2;
  return [
    path(`M${at(left, middle + rise / 2)}L${at(right, middle - rise / 2)}`, {
      stroke: 'pole',
      weight: 1.4,
      dash: [8, 5],
    }),
  ];
}

/** Mean gap at either side, under the edge that it belongs to. */
function depths(
  gaps: readonly number[],
  { left, right, padLeftY, padRightY, deepLeftY, deepRightY, compact }: RelevelPlaces,
  metric: boolean,
): Mark[] {
  // On a narrow sheet both stand under their edge, or beside it where they would meet.
  const under = compact && right - left >= 104;
  const beside = compact && !under;
  const [frontLeft = 0, backLeft = 0, backRight = 0, frontRight = 0] = gaps;
  const meanLeft = (frontLeft + backLeft) / 2;
  const meanRight = (frontRight + backRight) / 2;
  const side = (part: string, { x, padY, deepY }: { x: number; padY: number; deepY: number }): Mark[] =>
    deepY - padY < 2
      ? []
      : [
          path(
            `M${at(x - 5, padY)}L${at(x + 5, padY)}M${at(x - 5, deepY)}L${at(x + 5, deepY)}M${at(x, padY)}L${at(x, deepY)}`,
            {
              stroke: 'ink-2',
              weight: 0.9,
              part,
            },
          ),
          ...(deepY - padY > 18
            ? [arrow(x, padY, { to: 'up', part }), arrow(x, deepY, { to: 'down', part })]
            : []),
        ];
  return [
    ...side('dimension left gap', { x: left - 11, padY: padLeftY, deepY: deepLeftY }),
    ...side('dimension right gap', { x: right + 11, padY: padRightY, deepY: deepRightY }),
    text('dimension left gap', {
      x: under ? left : left - 19,
      y: under ? deepLeftY + 19 : (padLeftY + deepLeftY) / 2 + 4,
      anchor: under ? 'start' : 'end',
      runs: [{ text: dimensionText(meanLeft, 'in', metric), bold: true }],
    }),
    text('dimension right gap', {
      x: beside ? right + 19 : right,
      y: beside ? (padRightY + deepRightY) / 2 + 4 : deepRightY + 19,
      anchor: beside ? 'start' : 'end',
      runs: [
        { text: dimensionText(meanRight, 'in', metric), bold: true },
        ...(compact ? [] : [{ text: ' mean right', tone: 'muted' } as const]),
      ],
    }),
  ];
}

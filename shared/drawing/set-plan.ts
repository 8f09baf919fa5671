import { poleSizeAt } from '#shared/calc/pole-profile.ts';
import { SECTION_SIDES, type Section } from '#shared/calc/section.ts';
import { at, circle, path, round, through, type Mark } from './marks.ts';
import { crossText, dimensionText } from './dimension-text.ts';
import type { SetSection } from './set-section.ts';
import { INSET, LINE } from './sheet-spec.ts';
import type { Point, Run } from './sheet-types.ts';
import { textLines } from './text-lines.ts';

const RADIUS = 44;

/** What a section cannot show: a bore out of round, a pole that is not round, stands off centre, or is open below. */
export function needsPlan({ bore, pole, poleOffsetFt }: SetSection): boolean {
  if (bore === null || pole === null) return false;
  const top = bore.parts[0]?.top;
  return (
    (top !== undefined && top.a !== top.b) ||
    pole.section !== 'round' ||
    poleOffsetFt > 0.005 ||
    pole.openWallIn !== null
  );
}

/** Corners of a regular section about (x, y), two flats upright as the section shows them; `half` is half its width across flats. */
export function sectionCorners(section: Section, { x, y }: Point, half: number): Point[] {
  const sides = SECTION_SIDES[section];
  if (sides === null) return [];
  const radius = half / Math.cos(Math.PI / sides);
  return Array.from({ length: sides }, (_, index) => {
    const angle = ((2 * index + 1) * Math.PI) / sides;
    return { x: x + radius * Math.cos(angle), y: y + radius * Math.sin(angle) };
  });
}

/** Bore and pole at grade from above, to a scale of its own, with the words beside it; its upper left corner at (x, y). */
export function planMarks(
  section: SetSection,
  { x, y, metric }: { x: number; y: number; metric: boolean },
): Mark[] {
  const { bore, pole } = section;
  const top = bore?.parts[0]?.top;
  if (!bore || !pole || !top) return [];
  const scale = RADIUS / Math.max(top.a, top.b, 1);
  const centre = { x: x + RADIUS, y: y + INSET / 2 };
  const poleIn = poleSizeAt(pole, 0);
  const axis = { x: centre.x + section.poleOffsetFt * 12 * 2 * scale, y: centre.y };
  const outline = (half: number) =>
    pole.section === 'round'
      ? circle(axis.x, axis.y, round(half))
      : through(sectionCorners(pole.section, axis, half), true);
  const inside = pole.openWallIn === null ? 0 : poleIn - 2 * pole.openWallIn;
  return [
    path(ellipse(centre, { a: top.a * scale, b: top.b * scale }), {
      fill: 'sheet',
      ...(section.foam ? { material: 'foam' } : {}),
      stroke: 'ink',
      weight: 1.6,
    }),
    path(outline(poleIn * scale), { fill: 'pole-fill', stroke: 'pole', weight: 1.4 }),
    ...(inside > 0
      ? [path(outline(inside * scale), { fill: 'sheet', stroke: 'pole', weight: 1, dash: [4, 3] })]
      : []),
    ...axes(centre),
    ...textLines(
      [
        [{ text: 'Plan at grade', tone: 'muted' }],
        [
          { text: 'bore ', tone: 'muted' },
          { text: crossText([top.a, top.b], metric), bold: true },
        ],
        [
          { text: 'pole ', tone: 'muted' },
          { text: dimensionText(poleIn, 'in', metric), bold: true },
        ],
        ...shapeWords(pole.section, inside > 0).map((text): Run[] => [{ text, tone: 'muted' }]),
      ],
      { x: x + 2 * RADIUS + 14, y: y + INSET / 2 - 1.2 * LINE, part: 'plan' },
    ),
  ];
}

function ellipse({ x, y }: Point, { a, b }: { a: number; b: number }): string {
  const arc = `A${round(a)} ${round(b)} 0 1 0`;
  return `M${at(x - a, y)}${arc} ${at(x + a, y)}${arc} ${at(x - a, y)}Z`;
}

function axes({ x, y }: Point): Mark[] {
  const reach = RADIUS + 5;
  return [
    path(`M${at(x - reach, y)}L${at(x + reach, y)}M${at(x, y - reach)}L${at(x, y + reach)}`, {
      stroke: 'ink-2',
      weight: 0.7,
      dash: [10, 3, 2, 3],
    }),
  ];
}

function shapeWords(section: Section, open: boolean): string[] {
  const shape = section === 'round' ? 'round' : `${section}, across flats`;
  return open ? [shape, 'open butt'] : [shape];
}

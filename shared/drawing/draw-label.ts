import { linePaint } from './draw-dimension.ts';
import type { PlacedText } from './label-column.ts';
import { at, circle, path, type Mark, type TextMark } from './marks.ts';
import { BALLOON_R, FONT, LINE } from './sheet-spec.ts';

/** A label with its leader: dot at the place, slanting line, then level to the words or to the balloon. */
export function labelMarks(label: PlacedText): Mark[] {
  const { finding, anchor, tone, x } = label;
  const level = label.y - 4.5;
  const balloonX = x - BALLOON_R - 7;
  const endX = finding ? balloonX - BALLOON_R : x - 6;
  const marks: Mark[] = [];
  if (anchor) {
    const knee = finding ? '' : `L${at(endX - 18, level)}`;
    marks.push(
      path(`M${at(anchor.x, anchor.y)}${knee}L${at(endX, level)}`, {
        stroke: linePaint(tone),
        weight: 0.9,
        ...(finding ? { finding: finding.id } : {}),
      }),
      path(circle(anchor.x, anchor.y, 2.6), { fill: tone }),
    );
  }
  if (finding) marks.push({ is: 'balloon', x: balloonX, y: level, finding });
  return [...marks, ...words(label)];
}

function words(label: PlacedText): TextMark[] {
  const lines = [
    ...label.title.map((text) => ({ text, bold: true, tone: label.tone })),
    ...label.detail.map((text) => ({ text, tone: 'muted' as const })),
  ];
  return lines.map((run, index) => ({
    is: 'text',
    x: label.x,
    y: label.y + index * LINE,
    anchor: 'start',
    runs: [run],
    size: FONT,
    part: `label ${label.id}`,
  }));
}

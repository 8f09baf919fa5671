import { dimensionText } from './dimension-text.ts';
import { circle, path, type Mark } from './marks.ts';
import { runsWidth } from './mark-boxes.ts';
import type { CornerBalloon } from './relevel-layout.ts';
import type { RelevelPlaces } from './relevel-places.ts';
import type { RelevelSection } from './relevel-section.ts';
import { BALLOON_R, FONT } from './sheet-spec.ts';
import type { Run } from './sheet-types.ts';

/** How far a corner's figure stands off its corner. */
export const CORNER = 9;

export function cornerBaseline(y: number, { backY }: Pick<RelevelPlaces, 'backY'>): number {
  return y === backY ? y - 7 : y + 17;
}

function runsOf(
  corner: number,
  { gapIn, metric, compact }: { gapIn: number | null; metric: boolean; compact: boolean },
): Run[] {
  return [
    { text: `${corner}: `, bold: true },
    gapIn === null
      ? { text: compact ? '?' : 'not given', tone: 'query' }
      : { text: dimensionText(gapIn, 'in', metric), tone: 'muted' },
  ];
}

/** `3: 4.0 in`, as it stands beside its corner on a wide sheet. */
export function cornerText(corner: number, as: { gapIn: number | null; metric: boolean }): string {
  return runsOf(corner, { ...as, compact: false })
    .map((run) => run.text)
    .join('');
}

/** The four corners as seen from above, facing the doors: front left, back left, back right, front right, each with its gap. */
export function cornerMarks(
  { cornersIn }: RelevelSection,
  {
    places,
    balloons,
    metric,
  }: { places: RelevelPlaces; balloons: readonly CornerBalloon[]; metric: boolean },
): Mark[] {
  const { left, right, backY, frontY, compact } = places;
  // On a narrow sheet they stand over their corners, if there is room for two side by side.
  const over = compact && right - left >= 66;
  const corners = [
    { x: left, y: frontY },
    { x: left, y: backY },
    { x: right, y: backY },
    { x: right, y: frontY },
  ];
  return corners.flatMap(({ x, y }, index): Mark[] => {
    const atLeft = index < 2;
    const runs = runsOf(index + 1, { gapIn: cornersIn[index] ?? null, metric, compact });
    const baseline = cornerBaseline(y, places);
    const textX = over ? x : x + (atLeft ? -CORNER : CORNER);
    const balloon = balloons.find((one) => one.corner === index + 1);
    return [
      path(circle(x, y, 3.8), { fill: 'ink' }),
      {
        is: 'text',
        x: textX,
        y: baseline,
        anchor: over ? 'middle' : atLeft ? 'end' : 'start',
        runs,
        size: FONT,
        halo: true,
        part: `corner ${index + 1}`,
      },
      ...(balloon
        ? [
            {
              is: 'balloon',
              x: textX - runsWidth(runs, FONT) - BALLOON_R - 6,
              y: baseline - 4.5,
              finding: balloon.finding,
            } as const,
          ]
        : []),
    ];
  });
}

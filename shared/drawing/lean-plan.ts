import { formatNumber, unitWord } from '#shared/units/format-quantity.ts';
import { METRIC } from '#shared/units/convert.ts';
import { at, circle, path, round, type Mark } from './marks.ts';
import { INSET } from './sheet-spec.ts';
import type { Point, Run } from './sheet-types.ts';
import type { Lean, StraightenSection } from './straighten-section.ts';
import { textLines } from './text-lines.ts';

const RADIUS = 42;

/** Leans are vectors: a plan of them says what the section, which is in one plane, cannot. */
export function needsLeanPlan({ before, after, rake }: StraightenSection): boolean {
  return [before, after, rake].some((lean) => lean !== null && lean.amount > 0 && lean.azimuthDeg !== null);
}

type Place = {
  readonly x: number;
  readonly y: number;
  readonly metric: boolean;
  readonly limit: number | undefined;
};

/** Tip of a lean of `amount` towards an azimuth, clockwise from north, which is up. */
export function leanTip(centre: Point, { amount, azimuthDeg }: Lean, scale: number): Point | null {
  if (azimuthDeg === null) return null;
  const angle = (azimuthDeg * Math.PI) / 180;
  return { x: centre.x + amount * scale * Math.sin(angle), y: centre.y - amount * scale * Math.cos(angle) };
}

/** Before, after and the limit about the design rake, from above, north up; its upper left corner at (x, y). */
export function leanPlanMarks(section: StraightenSection, { x, y, metric, limit }: Place): Mark[] {
  const { before, after, rake } = section;
  const amounts = [before?.amount, after?.amount, (rake?.amount ?? 0) + (limit ?? 0)].map((one) => one ?? 0);
  const scale = RADIUS / Math.max(...amounts, 0.5);
  const centre = { x: x + RADIUS, y: y + INSET - RADIUS - 2 };
  const plumb = rake ? leanTip(centre, rake, scale) : centre;
  return [
    path(circle(centre.x, centre.y, RADIUS), { stroke: 'ink-2', weight: 0.8, opacity: 0.7 }),
    ...cross(centre),
    ...(plumb && limit !== undefined
      ? [
          path(circle(plumb.x, plumb.y, round(limit * scale)), {
            stroke: 'conform',
            weight: 1.1,
            dash: [3, 2.5],
          }),
        ]
      : []),
    ...ray(before, { centre, scale, stroke: 'pole', dash: [7, 4] }),
    ...ray(after, { centre, scale, stroke: 'ink' }),
    {
      is: 'text',
      x: centre.x,
      y: y + 10,
      runs: [{ text: 'N', bold: true, tone: 'muted' }],
      size: 11,
      anchor: 'middle',
      part: 'leans',
    },
    ...words(section, { x: x + 2 * RADIUS + 16, y: y + 26, metric, limit }),
  ];
}

function cross({ x, y }: Point): Mark[] {
  return [
    path(`M${at(x - RADIUS, y)}L${at(x + RADIUS, y)}M${at(x, y - RADIUS)}L${at(x, y + RADIUS)}`, {
      stroke: 'ink-2',
      weight: 0.6,
      dash: [8, 3, 2, 3],
    }),
  ];
}

function ray(
  lean: Lean | null,
  {
    centre,
    scale,
    stroke,
    dash,
  }: { centre: Point; scale: number; stroke: 'pole' | 'ink'; dash?: readonly number[] },
): Mark[] {
  const tip = lean && leanTip(centre, lean, scale);
  if (!tip) return [];
  return [
    path(`M${at(centre.x, centre.y)}L${at(tip.x, tip.y)}`, {
      stroke,
      weight: 1.6,
      ...(dash ? { dash } : {}),
    }),
    path(circle(tip.x, tip.y, 2.6), { fill: stroke }),
  ];
}

function words({ before, after, rake }: StraightenSection, { x, y, metric, limit }: Place): Mark[] {
  const number = (amount: number) =>
    formatNumber(metric ? (METRIC['in-per-10ft']?.convert(amount) ?? amount) : amount, {
      digits: 1,
      fixed: true,
    });
  const said = (word: string, lean: Lean): Run[] => [
    { text: `${word} `, tone: 'muted' },
    { text: number(lean.amount), bold: true },
    {
      text:
        lean.azimuthDeg === null ? ', no direction' : `, ${formatNumber(lean.azimuthDeg, { digits: 0 })}°`,
      tone: 'muted',
    },
  ];
  const lines: Run[][] = [
    [{ text: `Leans, ${unitWord('in-per-10ft', { metric })}`, tone: 'muted' }],
    ...(before ? [said('before', before)] : []),
    ...(after ? [said('after', after)] : []),
    ...(rake ? [said('rake', rake)] : []),
    ...(limit === undefined
      ? []
      : [
          [
            { text: 'limit ', tone: 'muted' as const },
            { text: number(limit), bold: true },
            { text: ', dashed ring', tone: 'muted' as const },
          ],
        ]),
  ];
  return textLines(lines, { x, y, part: 'leans' });
}

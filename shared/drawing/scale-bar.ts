import { M_PER_FT } from '#shared/units/convert.ts';
import { at, path, type Mark } from './marks.ts';

/** One foot (or two tenths of a metre) at the drawing's scale, which is given per foot. */
export function scaleBarMarks({
  x,
  y,
  scale,
  metric,
}: {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
  readonly metric: boolean;
}): Mark[] {
  const unit = metric ? (0.2 / M_PER_FT) * scale : scale;
  const text = { is: 'text', y: y + 20, size: 11, part: 'scale bar' } as const;
  return [
    path(
      [0, 0.5, 1].map((share) => `M${at(x + unit * share, y - 5)}L${at(x + unit * share, y + 5)}`).join(''),
      { stroke: 'ink', weight: 1 },
    ),
    path(`M${at(x, y)}L${at(x + unit, y)}`, { stroke: 'ink', weight: 1 }),
    path(`M${at(x, y)}L${at(x + unit / 2, y)}`, { stroke: 'ink', weight: 4.5 }),
    { ...text, x, anchor: 'middle', runs: [{ text: '0', tone: 'muted' }] },
    { ...text, x: x + unit, anchor: 'middle', runs: [{ text: metric ? '0.2 m' : '1 ft', tone: 'muted' }] },
  ];
}

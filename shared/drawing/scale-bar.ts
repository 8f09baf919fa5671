import { M_PER_FT } from '#shared/units/convert.ts';
import { at, path, type Mark } from './marks.ts';

/** Lengths of a bar, in feet and in metres: the first that is long enough to be read. */
const FEET = [1, 2, 5, 10, 20] as const;
const METRES = [0.2, 0.5, 1, 2, 5] as const;
const LEAST = 26;

function barOf(scale: number, metric: boolean): { readonly units: number; readonly word: string } {
  const lengths: readonly number[] = metric ? METRES : FEET;
  const perLength = metric ? scale / M_PER_FT : scale;
  const length = lengths.find((one) => one * perLength >= LEAST) ?? lengths.at(-1) ?? 1;
  return { units: length * perLength, word: `${length} ${metric ? 'm' : 'ft'}` };
}

/** A round length at the drawing's scale, which is given per foot. */
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
  const { units: unit, word } = barOf(scale, metric);
  const text = { is: 'text', y: y + 20, size: 11, part: 'scale bar' } as const;
  return [
    path(
      [0, 0.5, 1].map((share) => `M${at(x + unit * share, y - 5)}L${at(x + unit * share, y + 5)}`).join(''),
      { stroke: 'ink', weight: 1 },
    ),
    path(`M${at(x, y)}L${at(x + unit, y)}`, { stroke: 'ink', weight: 1 }),
    path(`M${at(x, y)}L${at(x + unit / 2, y)}`, { stroke: 'ink', weight: 4.5 }),
    { ...text, x, anchor: 'middle', runs: [{ text: '0', tone: 'muted' }] },
    { ...text, x: x + unit, anchor: 'middle', runs: [{ text: word, tone: 'muted' }] },
  ];
}

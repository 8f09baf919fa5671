import type { DownDimension } from './down-dimension.ts';
import type { DueTick } from './due-tick.ts';
import { arrow, at, path, type Mark, type Paint } from './marks.ts';
import type { AcrossDimension } from './set-dimensions.ts';
import { BALLOON_R, FONT } from './sheet-spec.ts';
import type { Tone } from './sheet-types.ts';

const TIGHT = 20;
const OUTSIDE = 16;
const THIN = { stroke: 'ink-2', weight: 0.9 } as const;

/** The colour of a tone's line: ink is lighter as a line than as a word. */
export function linePaint(tone: Tone): Paint {
  return tone === 'ink' ? 'ink-2' : tone;
}

/** Extension lines, the line between its arrows (broken where the pole stands in front), words at one side. */
export function acrossMarks(dimension: AcrossDimension): Mark[] {
  const { id, x1, x2, y, fromY, gap, textX, textAt, runs } = dimension;
  const part = `dimension ${id}`;
  const past = y < fromY ? -5 : 5;
  // Arrows that would meet stand outside and point inwards.
  const tight = x2 - x1 < TIGHT;
  const over = tight ? OUTSIDE : 0;
  const from = textAt === 'left' ? textX + 5 : x1 - over;
  const to = textAt === 'left' ? x2 + over : textX - 5;
  const line = gap
    ? `M${at(from, y)}L${at(gap[0], y)}M${at(gap[1], y)}L${at(to, y)}`
    : `M${at(from, y)}L${at(to, y)}`;
  return [
    path(`M${at(x1, fromY)}L${at(x1, y + past)}M${at(x2, fromY)}L${at(x2, y + past)}`, { ...THIN, part }),
    path(line, { ...THIN, part }),
    arrow(x1, y, { to: tight ? 'right' : 'left', part }),
    arrow(x2, y, { to: tight ? 'left' : 'right', part }),
    {
      is: 'text',
      x: textX,
      y: y + 4.5,
      anchor: textAt === 'left' ? 'end' : 'start',
      runs,
      size: FONT,
      halo: true,
      part,
    },
  ];
}

/** A depth down the left side; a finding on it sits on the line itself. */
export function downMarks(dimension: DownDimension): Mark[] {
  const { id, x, y1, y2, toX1, toX2, textY, runs, tone, balloon } = dimension;
  const part = `dimension ${id}`;
  const line = balloon
    ? `M${at(x, y1)}L${at(x, balloon.y - BALLOON_R)}M${at(x, balloon.y + BALLOON_R)}L${at(x, y2)}`
    : `M${at(x, y1)}L${at(x, y2)}`;
  return [
    path(`M${at(x - 12, y1)}L${at(toX1, y1)}M${at(x - 12, y2)}L${at(toX2, y2)}`, { ...THIN, part }),
    path(line, { stroke: linePaint(tone), weight: 1, part }),
    arrow(x, y1, { to: 'up', part }),
    arrow(x, y2, { to: 'down', part }),
    {
      is: 'text',
      x: x - 7,
      y: textY,
      anchor: 'middle',
      runs,
      size: FONT,
      halo: true,
      upright: true,
      part,
    },
    ...(balloon ? [{ is: 'balloon', x, y: balloon.y, finding: balloon.finding } as const] : []),
  ];
}

/** The depth that is due, as a tick beside the measured one. */
export function dueMarks(due: DueTick): Mark[] {
  return [
    path(`M${at(due.x1, due.y)}L${at(due.x2, due.y)}`, {
      stroke: linePaint(due.tone),
      weight: 1.5,
      dash: [6, 3],
      part: 'due',
    }),
    {
      is: 'text',
      x: due.textX,
      y: due.textY,
      anchor: 'start',
      runs: [{ text: due.text, tone: due.tone }],
      size: FONT,
      halo: true,
      part: 'due',
    },
  ];
}

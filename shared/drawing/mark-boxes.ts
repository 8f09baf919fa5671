import type { Mark, TextMark } from './marks.ts';
import { BALLOON_R } from './sheet-spec.ts';
import type { Box, Run } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** Noto Sans stands this much above and below its baseline in capitals, figures and tails, in em. */
const UP = 0.74;
const DOWN = 0.2;

export function runsWidth(runs: readonly Run[], size: number, spacing = 0): number {
  return runs.reduce(
    (sum, run) => sum + textWidth(run.text, size, run.bold) + spacing * Array.from(run.text).length,
    0,
  );
}

/** Everything that is to be read, as boxes. */
export function readBoxes(marks: readonly Mark[]): Box[] {
  return marks.flatMap((mark): Box[] => {
    if (mark.is === 'text') return [textBox(mark)];
    if (mark.is === 'path') return [];
    return [
      {
        id: `balloon ${mark.finding.number}`,
        x: mark.x - BALLOON_R,
        y: mark.y - BALLOON_R,
        width: 2 * BALLOON_R,
        height: 2 * BALLOON_R,
      },
    ];
  });
}

export function textBox({ x, y, runs, size, anchor, upright, spacing, part }: TextMark): Box {
  const length = runsWidth(runs, size, spacing);
  const before = anchor === 'start' ? 0 : anchor === 'middle' ? length / 2 : length;
  const id = `${part}: ${runs.map((run) => run.text).join('')}`;
  // Turned a quarter to the left the words run upwards.
  return upright
    ? { id, x: x - UP * size, y: y - length + before, width: (UP + DOWN) * size, height: length }
    : { id, x: x - before, y: y - UP * size, width: length, height: (UP + DOWN) * size };
}

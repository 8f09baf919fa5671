import type { Mark } from './marks.ts';
import { FONT, LINE } from './sheet-spec.ts';
import type { Point, Run } from './sheet-types.ts';

/** Lines of words under one another, the first with its baseline at (x, y). */
export const textLines = (
  lines: readonly (readonly Run[])[],
  { x, y, part }: Point & { readonly part: string },
): Mark[] =>
  lines.map((runs, index) => ({
    is: 'text',
    x,
    y: y + index * LINE,
    runs,
    size: FONT,
    anchor: 'start',
    part,
  }));

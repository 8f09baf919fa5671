import { at, path, type Mark } from './marks.ts';
import type { SheetStampData } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

const SPACING = 1.5;

export function stampWidth(stamp: SheetStampData): number {
  const word = stamp.word.toUpperCase();
  return (
    Math.max(textWidth(word, 14, true) + SPACING * word.length, textWidth(stamp.detail ?? '', 10.5)) + 24
  );
}

/** The stamp of a checked drawing, its upper left corner at (x, y). */
export function stampMarks(stamp: SheetStampData, { x, y }: { x: number; y: number }): Mark[] {
  const width = stampWidth(stamp);
  const height = stamp.detail ? 42 : 29;
  const frame = (inset: number, weight: number): Mark =>
    path(
      `M${at(x + inset, y + inset)}L${at(x + width - inset, y + inset)}L${at(x + width - inset, y + height - inset)}L${at(x + inset, y + height - inset)}Z`,
      { stroke: stamp.tone, weight },
    );
  const text = { is: 'text', x: x + width / 2, anchor: 'middle', part: 'stamp' } as const;
  return [
    frame(0, 2),
    frame(4, 1),
    {
      ...text,
      y: y + 20,
      size: 14,
      spacing: SPACING,
      runs: [{ text: stamp.word.toUpperCase(), bold: true, tone: stamp.tone }],
    },
    ...(stamp.detail
      ? [{ ...text, y: y + 33, size: 10.5, runs: [{ text: stamp.detail, tone: stamp.tone }] }]
      : []),
  ];
}

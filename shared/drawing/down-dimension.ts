import { BALLOON_R, FONT } from './sheet-spec.ts';
import { toneOf, type Run, type SheetFinding, type Tone } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** A dimension down the left side, its words along it. */
export type DownDimension = {
  readonly id: string;
  readonly x: number;
  readonly y1: number;
  readonly y2: number;
  /** Where the extension lines end, at the section. */
  readonly toX1: number;
  readonly toX2: number;
  readonly textY: number;
  readonly runs: readonly Run[];
  readonly tone: Tone;
  readonly balloon: { readonly finding: SheetFinding; readonly y: number } | null;
};

type Down = Pick<DownDimension, 'id' | 'x' | 'y1' | 'y2' | 'toX1' | 'toX2'> & {
  readonly value: string;
  readonly word: string;
  readonly finding: SheetFinding | null;
};

/** Words above, balloon below them, both within the line. */
export function downDimension({ value, word, finding, ...place }: Down): DownDimension {
  const { y1, y2 } = place;
  const tone = finding ? toneOf(finding) : 'ink';
  const balloonRoom = finding ? 2 * BALLOON_R + 16 : 0;
  const figure = textWidth(value, FONT, true);
  const whole = figure + textWidth(` ${word}`, FONT);
  // A short line keeps its figure; which depth it is shows from where the line ends.
  const fits = whole + balloonRoom + 8 <= y2 - y1;
  const length = fits ? whole : figure;
  const start = y1 + Math.max(4, (y2 - y1 - length - balloonRoom) / 2);
  return {
    ...place,
    textY: Math.round(start + length / 2),
    runs: [
      { text: value, bold: true, tone },
      ...(fits ? [{ text: ` ${word}`, tone: 'muted' as const }] : []),
    ],
    tone,
    balloon: finding ? { finding, y: Math.round(start + length + 16 + BALLOON_R) } : null,
  };
}

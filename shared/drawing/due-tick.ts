import { dimensionText } from './dimension-text.ts';
import type { DownDimension } from './down-dimension.ts';
import { round } from './marks.ts';
import { runsWidth } from './mark-boxes.ts';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import { BALLOON_R, FONT, type SheetSpec } from './sheet-spec.ts';
import type { Tone } from './sheet-types.ts';
import { textWidth } from './text-width.ts';

/** The depth that is due, as a tick beside the measured one, and its words. */
export type DueTick = {
  readonly x1: number;
  readonly x2: number;
  readonly y: number;
  readonly textX: number;
  readonly textY: number;
  readonly text: string;
  readonly tone: Tone;
};

type Input = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly spec: SheetSpec;
  readonly metric: boolean;
  readonly down: readonly DownDimension[];
  /** Of the line that the tick stands on. */
  readonly x: number;
};

type Area = { readonly x1: number; readonly x2: number; readonly y1: number; readonly y2: number };

/** Null: no depth is due, or it is not known. Short: in the colour of what does not conform, below everything. */
export function dueTick(input: Input): DueTick | null {
  const { section, geometry, metric, x } = input;
  const { dueFt, embedmentFt } = section;
  if (dueFt === null) return null;
  const y = round(geometry.y(dueFt));
  const text = `due ${dimensionText(dueFt, 'ft', metric)}`;
  const short = embedmentFt !== null && embedmentFt < dueFt - 1e-9;
  return {
    x1: x - 17,
    x2: short ? x + 38 : x + 14,
    y,
    ...wordsPlace(input, { y, width: textWidth(text, FONT) }),
    text,
    tone: short ? 'nonconform' : 'muted',
  };
}

/** The first place near the tick where no line or word of a dimension runs: beside the line first, then further down. */
function wordsPlace(
  { spec, x, down, geometry, section }: Input,
  { y, width }: { y: number; width: number },
): { textX: number; textY: number } {
  const taken = [...down.flatMap(downAreas), ...bottomAreas(section, geometry), tickArea(x, y)];
  const places = [-6, 17, -20, 31, -34, 45].flatMap((dy) =>
    [x + 7, x - 17, 6].map((textX) => ({ textX, textY: y + dy })),
  );
  const free = places.find(({ textX, textY }) => {
    const words = { x1: textX - 3, x2: textX + width + 3, y1: textY - 11, y2: textY + 4 };
    return words.x2 < spec.hatch.right && !taken.some((area) => meets(area, words));
  });
  return free ?? { textX: 6, textY: y + 17 };
}

function meets(a: Area, b: Area): boolean {
  return a.x1 < b.x2 && b.x1 < a.x2 && a.y1 < b.y2 && b.y1 < a.y2;
}

function tickArea(x: number, y: number): Area {
  return { x1: x - 17, x2: x + 38, y1: y - 1, y2: y + 1 };
}

/** The line with its words, and the extension lines at its ends. */
function downAreas({ x, y1, y2, toX1, toX2, textY, runs, balloon }: DownDimension): Area[] {
  const half = runsWidth(runs, FONT) / 2;
  return [
    { x1: x - 1, x2: x + 1, y1, y2 },
    { x1: x - 20, x2: x - 4, y1: textY - half, y2: textY + half },
    { x1: x - 12, x2: toX1, y1: y1 - 1, y2: y1 + 1 },
    { x1: x - 12, x2: toX2, y1: y2 - 1, y2: y2 + 1 },
    ...(balloon
      ? [{ x1: x - BALLOON_R, x2: x + BALLOON_R, y1: balloon.y - BALLOON_R, y2: balloon.y + BALLOON_R }]
      : []),
  ];
}

/** Below bore and butt hang the extension lines of their widths, however far. */
function bottomAreas({ bore: profile }: SetSection, { bore, pole, x, y }: SetGeometry): Area[] {
  const hanging = (at: number, from: number): Area => ({ x1: at - 1, x2: at + 1, y1: from, y2: Infinity });
  const shaft = profile?.parts[0];
  return [
    ...(pole ? [hanging(pole.buttLeft, pole.buttY), hanging(pole.buttRight, pole.buttY)] : []),
    ...(bore ? [hanging(bore.bottomLeft, bore.bottomY), hanging(bore.bottomRight, bore.bottomY)] : []),
    ...(shaft ? [hanging(x(-shaft.bottom.a / 24), y(shaft.toFt))] : []),
  ];
}

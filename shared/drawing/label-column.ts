import { placeLabels } from './place-labels.ts';
import { BALLOON_R, FONT, LINE, type SheetSpec } from './sheet-spec.ts';
import { wrapText } from './text-width.ts';
import type { Point, SheetFinding, Tone } from './sheet-types.ts';

/** What a label says. */
export type ColumnLabel = {
  readonly id: string;
  readonly title: string;
  readonly detail: string;
  readonly tone: Tone;
  readonly finding: SheetFinding | null;
  readonly optional?: boolean;
};

export type PlacedText = {
  readonly id: string;
  readonly x: number;
  /** Baseline of the first line. */
  readonly y: number;
  readonly height: number;
  readonly width: number;
  readonly title: readonly string[];
  readonly detail: readonly string[];
  readonly tone: Tone;
  readonly finding: SheetFinding | null;
  /** Null: it concerns nothing on the drawing. */
  readonly anchor: Point | null;
};

const ASCENT = 12;

type Column<Label> = {
  readonly spec: SheetSpec;
  readonly bottom: number;
  readonly pointOf: (label: Label) => Point | null;
  /** Where what is nowhere on the drawing stands: last unless told. */
  readonly loose?: 'first' | 'last';
};

/** Full words, else their first line, else titles alone: a finding is shortened before it is left out. */
const LEVELS = [
  { title: 3, detail: 3 },
  { title: 2, detail: 1 },
  { title: 1, detail: 0 },
] as const;

/** Puts labels in the column at the right of a drawing, each level with what it names, none overlapping. */
export function placeColumn<Label extends ColumnLabel>(
  labels: readonly Label[],
  room: Column<Label>,
): { labels: PlacedText[]; leftOut: Label[] } {
  const tried = LEVELS.map((level) => placeAt(labels, { ...room, level }));
  const complete = tried.find(({ leftOut }) => !leftOut.some((label) => !label.optional));
  return complete ?? placeAt(labels, { ...room, level: LEVELS[2] });
}

function placeAt<Label extends ColumnLabel>(
  labels: readonly Label[],
  { spec, bottom, pointOf, level, loose = 'last' }: Column<Label> & { level: (typeof LEVELS)[number] },
): { labels: PlacedText[]; leftOut: Label[] } {
  const { x, width, top, mostLines } = spec.labels;
  const drawn = labels.map((label) => {
    const title = wrapText(label.title, {
      width,
      size: FONT,
      bold: true,
      most: Math.min(level.title, mostLines),
    });
    const detail =
      level.detail === 0
        ? []
        : wrapText(label.detail, { width, size: FONT, most: Math.min(level.detail, mostLines) });
    const lines = title.length + detail.length;
    return {
      label,
      title,
      detail,
      height: Math.max(lines * LINE, label.finding ? 2 * BALLOON_R : 0),
      anchor: pointOf(label),
    };
  });
  const { placed, left } = placeLabels(
    drawn.map(({ label, height, anchor }) => ({
      id: label.id,
      wantY: anchor === null ? (loose === 'last' ? bottom : top) : anchor.y,
      height,
      optional: label.optional,
    })),
    { top, bottom, gap: 14 },
  );
  const gone = new Set(left);
  return {
    labels: placed.flatMap((place) => {
      const found = drawn.find((one) => one.label.id === place.id);
      if (!found) return [];
      const { label, title, detail, height, anchor } = found;
      return [
        {
          id: label.id,
          x,
          y: place.y + ASCENT,
          height,
          width,
          title,
          detail,
          tone: label.tone,
          finding: label.finding,
          anchor,
        },
      ];
    }),
    leftOut: labels.filter((label) => gone.has(label.id)),
  };
}

import { path, type Mark } from '#shared/drawing/marks.ts';
import type { Run } from '#shared/drawing/sheet-types.ts';
import { fitText, wrapText } from '#shared/drawing/text-width.ts';

/** A piece of a list that is not broken over pages; `marks` at a place on the page, its top left. */
export type Piece = {
  readonly height: number;
  /** A heading does not stand alone at a page's foot. */
  readonly heading?: boolean;
  readonly marks: (at: { x: number; y: number }) => Mark[];
};

const BODY = 9;
const LEADING = 12;

type Line = {
  readonly runs: readonly Run[];
  readonly indent?: number;
  /** At the right edge of the same line. */
  readonly aside?: string;
};

export function words(
  { x, y }: { x: number; y: number },
  { runs, size = BODY, anchor = 'start' }: { runs: readonly Run[]; size?: number; anchor?: 'start' | 'end' },
): Mark {
  return { is: 'text', x, y, runs, size, anchor, part: 'list' };
}

/** A heading over a thin line of ink. */
export function heading(text: string, { width, aside }: { width: number; aside?: string }): Piece {
  return {
    height: 26,
    heading: true,
    marks: ({ x, y }) => [
      words({ x, y: y + 17 }, { runs: [{ text, bold: true }], size: 10.5 }),
      ...(aside
        ? [words({ x: x + width, y: y + 17 }, { runs: [{ text: aside, tone: 'muted' }], anchor: 'end' })]
        : []),
      path(`M${x} ${y + 22}L${x + width} ${y + 22}`, { stroke: 'ink', weight: 0.9 }),
    ],
  };
}

/** Lines of one entry, with a hairline under it. */
export function entry(lines: readonly Line[], width: number): Piece {
  return {
    height: lines.length * LEADING + 6,
    marks: ({ x, y }) => [
      ...lines.flatMap((line, index): Mark[] => {
        const baseline = y + 11 + index * LEADING;
        return [
          words({ x: x + (line.indent ?? 0), y: baseline }, { runs: line.runs }),
          ...(line.aside
            ? [
                words(
                  { x: x + width, y: baseline },
                  { runs: [{ text: line.aside, tone: 'ink-2' }], anchor: 'end' },
                ),
              ]
            : []),
        ];
      }),
      path(`M${x} ${y + lines.length * LEADING + 4}L${x + width} ${y + lines.length * LEADING + 4}`, {
        stroke: 'soil',
        weight: 0.4,
      }),
    ],
  };
}

/** A text over as many lines as it takes. */
export function paragraph(
  text: string,
  { width, indent = 0, tone }: { width: number; indent?: number; tone?: Run['tone'] },
): Line[] {
  return wrapText(text, { width: width - indent, size: BODY, most: 60 }).map((line) => ({
    runs: [{ text: line, ...(tone ? { tone } : {}) }],
    indent,
  }));
}

/** A row of cells of fixed widths, each cut where it is too long. */
export function cells(
  texts: readonly string[],
  { widths, tone }: { widths: readonly number[]; tone?: Run['tone'] },
): Piece {
  return {
    height: 14,
    marks: ({ x, y }) => {
      let left = x;
      return texts.map((text, index) => {
        const room = widths[index] ?? 0;
        const mark = words(
          { x: left, y: y + 10.5 },
          {
            runs: [{ text: fitText(text, { width: room - 6, size: 8.5 }), ...(tone ? { tone } : {}) }],
            size: 8.5,
          },
        );
        left += room;
        return mark;
      });
    },
  };
}

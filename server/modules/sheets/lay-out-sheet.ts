import { drawSheet } from '#shared/drawing/draw-sheet.ts';
import { lineStamp } from '#shared/drawing/line-stamp.ts';
import { path, type Mark } from '#shared/drawing/marks.ts';
import { sheetFindings } from '#shared/drawing/number-findings.ts';
import { titleBlockData } from '#shared/drawing/title-block-data.ts';
import { WHO_DECIDES } from '#shared/drawing/who-decides.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { words, type Piece } from './flow.ts';
import { MARGIN, PAPER_SIZES, type Paper, type PaperSize } from './paper.ts';
import type { SheetContent } from './sheet-content.ts';
import { sheetLists } from './sheet-lists.ts';

/** Marks that are written at a place and scale; a figure says in `alt` what it shows. */
export type PageGroup = {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
  readonly marks: readonly Mark[];
  readonly alt?: string;
};
export type SheetPage = { readonly groups: readonly PageGroup[]; readonly foot: string };

const FOOT = 30;
/** Words of 13 units are 7.8 points high then. */
const LEAST_SCALE = 0.6;

/** The pages of one record sheet: the drawing with its title block, then its lists, over as many pages as they take. */
export function layOutSheet(content: SheetContent, paper: Paper): SheetPage[] {
  const size = PAPER_SIZES[paper];
  const width = size.width - 2 * MARGIN;
  const pieces = sheetLists(content, width);
  const bottom = size.height - MARGIN - FOOT + 12;
  const lists = pieces.reduce((sum, piece) => sum + piece.height, 0);
  const { figure, height } = figureGroup(content, { width, beside: bottom - MARGIN - 20 - lists });
  const caution = words(
    { x: MARGIN, y: MARGIN + height + 15 },
    { runs: [{ text: WHO_DECIDES, tone: 'query' }], size: 8 },
  );
  const pages: PageGroup[][] = [[figure, { x: 0, y: 0, scale: 1, marks: [caution] }]];
  let y = MARGIN + height + 20;
  pieces.forEach((piece, index) => {
    if (y + heightWithNext(pieces, index) > bottom && y > MARGIN + 20) {
      const next = nextPage(content, size);
      pages.push([next.group]);
      y = next.y;
    }
    pages.at(-1)?.push({ x: 0, y: 0, scale: 1, marks: piece.marks({ x: MARGIN, y }) });
    y += piece.height;
  });
  return pages.map((groups) => ({ groups, foot: footText(content) }));
}

/** A heading and what follows it stay together. */
function heightWithNext(pieces: readonly Piece[], index: number): number {
  const piece = pieces[index];
  if (!piece) return 0;
  return piece.height + (piece.heading ? heightWithNext(pieces, index + 1) : 0);
}

/** As wide as the page, or smaller where that brings the whole sheet on to one page and still reads well. */
function figureGroup(
  content: SheetContent,
  { width, beside }: { width: number; beside: number },
): { figure: PageGroup; height: number } {
  const { data, limits, zone } = content;
  const drawing = drawSheet({
    record: {
      ...data.record,
      values: data.record.values as FieldValues,
      pours: data.pours,
      events: data.events.map((event) => event.values as FieldValues),
    },
    findings: sheetFindings(data.findings),
    titleBlock: titleBlockData(data.titleBlock),
    limits,
    stamp: lineStamp(data.record, data.findings, zone),
  });
  const full = width / drawing.width;
  const whole = beside / drawing.height;
  const scale = whole < full && whole >= LEAST_SCALE ? whole : full;
  const frame = (inset: number, weight: number): Mark => {
    const [right, bottom] = [drawing.width - inset, drawing.height - inset];
    return path(`M${inset} ${inset}L${right} ${inset}L${right} ${bottom}L${inset} ${bottom}Z`, {
      stroke: inset === 0 ? 'soil' : 'ink',
      weight,
    });
  };
  return {
    figure: {
      x: MARGIN + (width - drawing.width * scale) / 2,
      y: MARGIN,
      scale,
      marks: [frame(0, 0.8), frame(5, 1.6), ...drawing.marks],
      alt: drawing.sentences.join(' '),
    },
    height: drawing.height * scale,
  };
}

/** A further page begins with whose it is. */
function nextPage({ data }: SheetContent, size: PaperSize): { group: PageGroup; y: number } {
  const { titleBlock } = data;
  const runs = [
    { text: `Structure ${titleBlock.structure}`, bold: true },
    { text: `  ${titleBlock.kind}, sheet ${titleBlock.sheet}, continued`, tone: 'muted' },
  ] as const;
  return {
    group: {
      x: 0,
      y: 0,
      scale: 1,
      marks: [
        words({ x: MARGIN, y: MARGIN + 10 }, { runs, size: 10.5 }),
        path(`M${MARGIN} ${MARGIN + 16}L${size.width - MARGIN} ${MARGIN + 16}`, {
          stroke: 'ink',
          weight: 0.9,
        }),
      ],
    },
    y: MARGIN + 20,
  };
}

function footText({ data }: SheetContent): string {
  const { titleBlock, batch } = data;
  return `${titleBlock.owner}  ·  work order ${titleBlock.workOrder}  ·  batch ${batch.number}, revision ${titleBlock.revision}  ·  structure ${titleBlock.structure}`;
}

import { fitText } from '#shared/drawing/text-width.ts';
import { words } from './flow.ts';
import type { PageGroup, SheetPage } from './lay-out-sheet.ts';
import { MARGIN } from './paper.ts';
import type { MarkWriter } from './write-marks.ts';

/** Writes pages, each with its number of all. */
export function writePages(
  doc: PDFKit.PDFDocument,
  {
    pages,
    first,
    total,
    write,
  }: {
    readonly pages: readonly SheetPage[];
    /** Number of the first of them. */
    readonly first: number;
    readonly total: number;
    readonly write: MarkWriter;
  },
): void {
  pages.forEach((page, index) => {
    doc.addPage();
    for (const group of page.groups) writeGroup(doc, group, write);
    writeFoot(page.foot, `page ${first + index} of ${total}`);
  });

  function writeFoot(text: string, count: string): void {
    const { width, height } = doc.page;
    const y = height - MARGIN + 4;
    doc.markContent('Artifact', { type: 'Pagination' });
    write([
      words(
        { x: MARGIN, y },
        {
          runs: [{ text: fitText(text, { width: width - 2 * MARGIN - 90, size: 8 }), tone: 'muted' }],
          size: 8,
        },
      ),
      words({ x: width - MARGIN, y }, { runs: [{ text: count, bold: true }], size: 8, anchor: 'end' }),
    ]);
    doc.endMarkedContent();
  }
}

function writeGroup(
  doc: PDFKit.PDFDocument,
  { x, y, scale, marks, alt }: PageGroup,
  write: MarkWriter,
): void {
  const draw = () => {
    doc.save();
    doc.translate(x, y).scale(scale);
    write(marks);
    doc.restore();
  };
  const element = alt === undefined ? doc.struct('P', {}, draw) : doc.struct('Figure', { alt }, draw);
  doc.addStructure(element);
  element.end();
}

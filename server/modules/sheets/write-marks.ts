import { LIGHT_COLOURS } from '#shared/drawing/light-colours.ts';
import type { BalloonMark, Mark, Paint, PathMark, TextMark } from '#shared/drawing/marks.ts';
import { circle } from '#shared/drawing/marks.ts';
import { runsWidth, textBox } from '#shared/drawing/mark-boxes.ts';
import { TILES, type Material } from '#shared/drawing/materials.ts';
import { BALLOON_R, FONT } from '#shared/drawing/sheet-spec.ts';
import { toneOf } from '#shared/drawing/sheet-types.ts';
import { tilePatterns } from './tile-pattern.ts';

/** Paper is paper: the sheet's own ground is left white. */
const COLOURS: Readonly<Record<Paint, string>> = { ...LIGHT_COLOURS, sheet: '#ffffff' };

export type MarkWriter = (marks: readonly Mark[]) => void;

/** Writes marks on the document's page, in the units and at the place that its transform has. */
export function markWriter(doc: PDFKit.PDFDocument): MarkWriter {
  const pattern = tilePatterns(doc);
  return (marks) => {
    for (const mark of marks) {
      if (mark.is === 'path') writePath(mark);
      else if (mark.is === 'text') writeText(mark);
      else writeBalloon(mark);
    }
  };

  function writePath({ d, fill, material, stroke, weight = 1, dash, opacity = 1 }: PathMark): void {
    if (fill) doc.path(d).fillOpacity(opacity).fillColor(COLOURS[fill]).fill();
    if (material) writeMaterial(d, material);
    if (!stroke) return;
    doc.path(d).lineWidth(weight).lineJoin('round').strokeOpacity(opacity).strokeColor(COLOURS[stroke]);
    if (dash) doc.dash(dash[0] ?? 1, { space: dash[1] ?? dash[0] ?? 1 });
    if (dash && dash.length > 2) setDash(dash);
    doc.stroke();
    if (dash) doc.undash();
  }

  /** A line of more than two lengths; the shorthand above knows one dash and one space. */
  function setDash(dash: readonly number[]): void {
    (doc as unknown as { dash(lengths: readonly number[]): void }).dash(dash);
  }

  function writeMaterial(d: string, material: Material): void {
    const tile = TILES[material];
    if (tile.ground) doc.path(d).fillOpacity(1).fillColor(COLOURS[tile.ground]).fill();
    doc.path(d).fillOpacity(tile.opacity);
    (doc as unknown as { fillColor(colour: readonly [unknown, string]): void }).fillColor([
      pattern(material),
      COLOURS[tile.paint],
    ]);
    doc.fill();
  }

  function writeText(mark: TextMark): void {
    const { x, y, runs, size, anchor, upright, spacing = 0, halo } = mark;
    if (halo) {
      const box = textBox(mark);
      doc
        .rect(box.x - 2, box.y, box.width + 4, box.height)
        .fillOpacity(1)
        .fillColor(COLOURS.sheet)
        .fill();
    }
    const width = runsWidth(runs, size, spacing);
    let at = anchor === 'start' ? x : anchor === 'middle' ? x - width / 2 : x - width;
    doc.save();
    if (upright) doc.rotate(-90, { origin: [x, y] });
    for (const run of runs) {
      doc
        .font(run.bold ? 'semibold' : 'regular')
        .fontSize(size)
        .fillOpacity(1)
        .fillColor(COLOURS[run.tone ?? 'ink'])
        .text(run.text, at, y, { lineBreak: false, baseline: 'alphabetic', characterSpacing: spacing });
      at += runsWidth([run], size, spacing);
    }
    doc.restore();
  }

  function writeBalloon({ x, y, finding }: BalloonMark): void {
    const tone = toneOf(finding);
    writePath({
      is: 'path',
      d: circle(x, y, BALLOON_R),
      fill: 'sheet',
      stroke: tone === 'ink' ? 'ink-2' : tone,
      weight: 1.7,
    });
    writeText({
      is: 'text',
      x,
      y: y + 4.4,
      runs: [{ text: String(finding.number), bold: true, tone }],
      size: FONT - 0.5,
      anchor: 'middle',
      part: 'balloon',
    });
  }
}

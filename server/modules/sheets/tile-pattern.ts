import { TILES, type Material, type Tile } from '#shared/drawing/materials.ts';

/** A tiling pattern as pdfkit knows it; the published types lack it. */
type Pattern = { readonly stream: string };
type WithPatterns = {
  pattern(
    box: readonly [number, number, number, number],
    xStep: number,
    yStep: number,
    stream: string,
  ): Pattern;
};

/** A circle's quarter as a curve: (4/3)·tan(π/8). */
const KAPPA = 0.5523;

/** Patterns of a document, each made once. */
export function tilePatterns(doc: PDFKit.PDFDocument): (material: Material) => Pattern {
  const made = new Map<Material, Pattern>();
  return (material) => {
    const known = made.get(material);
    if (known) return known;
    const tile = TILES[material];
    const pattern = (doc as unknown as WithPatterns).pattern(
      [0, 0, tile.width, tile.height],
      tile.width,
      tile.height,
      tileCommands(tile),
    );
    made.set(material, pattern);
    return pattern;
  };
}

/** The tile in page commands; its colour is given where it is used. */
export function tileCommands({ weight, lines, rings, dots }: Tile): string {
  return [
    `${weight} w`,
    ...lines.map((points) => `${polyline(points)} S`),
    ...rings.map((ring) => `${circle(ring)} S`),
    ...dots.map((dot) => `${circle(dot)} f`),
  ].join('\n');
}

function polyline(points: readonly number[]): string {
  const commands: string[] = [];
  for (let index = 0; index + 1 < points.length; index += 2)
    commands.push(`${points[index]} ${points[index + 1]} ${index === 0 ? 'm' : 'l'}`);
  return commands.join(' ');
}

function circle([x, y, r]: readonly [number, number, number]): string {
  const k = r * KAPPA;
  const at = (...values: number[]) => values.map((value) => Math.round(value * 1000) / 1000).join(' ');
  return [
    `${at(x + r, y)} m`,
    `${at(x + r, y + k, x + k, y + r, x, y + r)} c`,
    `${at(x - k, y + r, x - r, y + k, x - r, y)} c`,
    `${at(x - r, y - k, x - k, y - r, x, y - r)} c`,
    `${at(x + k, y - r, x + r, y - k, x + r, y)} c h`,
  ].join(' ');
}

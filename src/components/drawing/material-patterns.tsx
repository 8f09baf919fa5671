import { TILES, type Material, type Tile } from '#shared/drawing/materials.ts';
import { FILL, STROKE } from './paint-classes.ts';

const MATERIALS = Object.keys(TILES) as Material[];

/** Id of a fill pattern; ids differ from sheet to sheet on a page. */
export function patternId(sheet: string, material: Material): string {
  return `${sheet.replaceAll(/[^\w-]/g, '')}-${material}`;
}

/** The fill patterns of one sheet. */
export function MaterialPatterns({ sheet }: { sheet: string }) {
  return (
    <defs>
      {MATERIALS.map((material) => (
        <Pattern key={material} id={patternId(sheet, material)} tile={TILES[material]} />
      ))}
    </defs>
  );
}

function Pattern({ id, tile }: { id: string; tile: Tile }) {
  const { width, height, ground, paint, weight, opacity, lines, rings, dots } = tile;
  return (
    <pattern id={id} width={width} height={height} patternUnits="userSpaceOnUse">
      {ground ? <rect width={width} height={height} className={FILL[ground]} /> : null}
      <g opacity={opacity} strokeWidth={weight}>
        <path d={lines.map(lineThrough).join('')} className={`fill-none ${STROKE[paint]}`} />
        {rings.map(([x, y, r]) => (
          <circle key={`${x} ${y}`} cx={x} cy={y} r={r} className={`fill-none ${STROKE[paint]}`} />
        ))}
        {dots.map(([x, y, r]) => (
          <circle key={`${x} ${y}`} cx={x} cy={y} r={r} className={FILL[paint]} />
        ))}
      </g>
    </pattern>
  );
}

function lineThrough(points: readonly number[]): string {
  return `M${points.join(' ')}`;
}

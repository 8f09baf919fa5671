import type { Random } from './random.ts';
import { strokeText } from './stroke-text.ts';

export const WIDTH = 1600;
export const HEIGHT = 1200;

export type Point = { x: number; y: number };

/** An irregular closed outline around an ellipse; `rough` is the share that a radius strays. */
export function blob(
  random: Random,
  at: Point,
  { rx, ry, rough }: { rx: number; ry: number; rough: number },
): string {
  const count = rx < 25 ? 8 : 26;
  const points = Array.from({ length: count }, (_, n) => {
    const angle = (n / count) * Math.PI * 2;
    const stray = 1 + random.between(-rough, rough);
    return { x: at.x + Math.cos(angle) * rx * stray, y: at.y + Math.sin(angle) * ry * stray };
  });
  return smooth(points);
}

/** A closed curve through the middles of a polygon's edges. */
function smooth(points: readonly Point[]): string {
  const middle = (n: number): Point => {
    const a = points[n % points.length]!;
    const b = points[(n + 1) % points.length]!;
    return { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
  };
  const start = middle(0);
  const curves = points.map((_, n) => {
    const corner = points[(n + 1) % points.length]!;
    const to = middle(n + 1);
    return `Q${round(corner.x)} ${round(corner.y)} ${round(to.x)} ${round(to.y)}`;
  });
  return `M${round(start.x)} ${round(start.y)}${curves.join('')}Z`;
}

/** Clods of earth strewn over an area, larger towards the viewer. */
export function clods(
  random: Random,
  { count, colours, area }: { count: number; colours: readonly string[]; area: (random: Random) => Point },
): string {
  return Array.from({ length: count }, () => {
    const at = area(random);
    const near = 0.4 + 0.9 * Math.max(0, at.y / HEIGHT);
    const rx = random.between(4, 20) * near;
    const ry = rx * random.between(0.45, 0.8);
    const shade = blob(random, { x: at.x + rx * 0.25, y: at.y + ry * 0.45 }, { rx, ry, rough: 0.1 });
    const body = blob(random, at, { rx, ry, rough: 0.28 });
    return `<path d="${shade}" fill="#000" fill-opacity="0.28"/><path d="${body}" fill="${random.pick(colours)}"/>`;
  }).join('');
}

/** Blades of grass, drawn from the far ones to the near ones. */
export function grass(
  random: Random,
  {
    count,
    colours,
    area,
    length,
  }: { count: number; colours: readonly string[]; area: (random: Random) => Point; length: number },
): string {
  const roots = Array.from({ length: count }, () => area(random)).sort((a, b) => a.y - b.y);
  return roots
    .map(({ x, y }) => {
      const tall = length * random.between(0.4, 1.1) * (0.35 + 0.8 * (y / HEIGHT));
      const bend = random.between(-0.6, 0.6) * tall;
      const path = `M${round(x)} ${round(y)}q${round(bend * 0.2)} ${round(-tall * 0.6)} ${round(bend)} ${round(-tall)}`;
      return `<path d="${path}" stroke="${random.pick(colours)}" stroke-width="${round(1.5 + tall / 28)}" fill="none" stroke-linecap="round"/>`;
    })
    .join('');
}

/** A card with the structure's number, as crews lay one into the picture. */
export function numberCard(random: Random, text: string, at: Point): string {
  const tilt = random.between(-9, 9);
  return `<g transform="translate(${round(at.x)} ${round(at.y)}) rotate(${round(tilt)})">
<rect x="-158" y="-62" width="330" height="150" fill="#000" fill-opacity="0.32"/>
<rect x="-165" y="-75" width="330" height="150" rx="5" fill="#efeadb"/>
<rect x="-153" y="-63" width="306" height="126" fill="none" stroke="#b9b29d" stroke-width="3"/>
${strokeText(text, { x: 0, y: -24, size: 45, colour: '#26303f', anchor: 'middle', weight: 0.14 })}</g>`;
}

/** A number for SVG text, to a tenth of a pixel. */
export function round(value: number): number {
  return Math.round(value * 10) / 10;
}

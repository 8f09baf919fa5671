import type { Scene } from './scene.ts';
import { field, pole } from './scene-field.ts';
import { HEIGHT, blob, clods, numberCard, round } from './shapes.ts';
import { strokeText } from './stroke-text.ts';

/** The set pole from some way off, a long level held against it. */
export const drawPlumb: Scene = (subject, random, light) => {
  const horizon = 760 + random.whole(-40, 40);
  const x = 800 + random.between(-120, 120);
  const lean = subject.leanDeg * random.pick([-1, 1]);
  const shaft = { x, foot: 1120, top: -60, wide: 150, lean };
  return [
    field(random, light, horizon),
    mound(x, light.soil, random),
    pole(random, light, shaft),
    `<g transform="rotate(${round(lean)} ${round(x)} 1120)">${level(x + 66, 330, 560)}</g>`,
    numberCard(random, subject.structureNumber, { x: x + 380, y: 1080 }),
  ].join('');
};

/** Leaning before the work, or plumb after it, from further off: the whole pole. */
export const drawStanding: Scene = (subject, random, light) => {
  const horizon = 800;
  const x = 760 + random.between(-90, 90);
  const lean = subject.view === 'before' ? subject.leanDeg : subject.leanDeg * 0.15;
  const arm = `<g transform="rotate(${round(lean)} ${round(x)} 1030)"><rect x="${round(x - 210)}" y="175" width="420" height="26" fill="${light.pole.dark}"/>${[-195, -110, 110, 195].map((dx) => `<rect x="${round(x + dx - 7)}" y="142" width="14" height="34" rx="5" fill="#8d9699"/>`).join('')}</g>`;
  const plumbLine = `<path d="M${round(x + 250)} 120V1010" stroke="#e9e3cf" stroke-width="4"/><path d="M${round(x + 238)} 1000h24l-12 42Z" fill="#b08d3a"/>`;
  return [
    field(random, light, horizon),
    mound(x, light.soil, random, 0.7),
    pole(random, light, { x, foot: 1030, top: 110, wide: 74, lean }),
    arm,
    plumbLine,
    numberCard(random, subject.structureNumber, { x: x - 400, y: 1085 }),
  ].join('');
};

/** The maker's mark, burnt in, close to. */
export const drawBrand: Scene = (subject, random, light) => {
  const x = 800 + random.between(-60, 60);
  const mark = (line: string, y: number, size: number): string =>
    strokeText(line, { x: x + 3, y: y + 3, size, colour: light.pole.light, anchor: 'middle' }) +
    strokeText(line, { x, y, size, colour: '#2a1d12', anchor: 'middle' });
  return [
    field(random, light, 640),
    pole(random, light, { x, foot: HEIGHT + 60, top: -60, wide: 720, lean: random.between(-1.5, 1.5) }),
    mark('SP', 330, 92),
    mark(`${subject.pole.poleClass}-${subject.pole.lengthFt}`, 480, 110),
    mark('03 26', 660, 74),
    numberCard(random, subject.structureNumber, { x: x + 110, y: 960 }),
  ].join('');
};

function mound(
  x: number,
  soil: { ground: string; light: string; dark: string },
  random: Parameters<Scene>[1],
  scale = 1,
): string {
  const at = { x, y: scale === 1 ? 1130 : 1040 };
  const size = { rx: 330 * scale, ry: 74 * scale };
  const inside = (r: typeof random) => {
    const angle = r.between(0, Math.PI * 2);
    const out = Math.sqrt(r.between(0, 1)) * 0.95;
    return { x: at.x + Math.cos(angle) * size.rx * out, y: at.y + Math.sin(angle) * size.ry * out };
  };
  return `<path d="${blob(random, at, { ...size, rough: 0.05 })}" fill="${soil.ground}"/>${clods(random, { count: 140, colours: [soil.ground, soil.light, soil.dark], area: inside })}`;
}

/** A long level, upright, with its bubble in the middle vial. */
function level(x: number, top: number, length: number): string {
  const middle = top + length / 2;
  return `<rect x="${round(x + 10)}" y="${top + 12}" width="62" height="${length}" rx="6" fill="#000" fill-opacity="0.28"/>
<rect x="${round(x)}" y="${top}" width="62" height="${length}" rx="6" fill="#c0472c"/><rect x="${round(x + 8)}" y="${top}" width="10" height="${length}" fill="#fff" fill-opacity="0.22"/>
<rect x="${round(x + 8)}" y="${middle - 46}" width="46" height="92" rx="10" fill="#2b2b28"/><rect x="${round(x + 14)}" y="${middle - 38}" width="34" height="76" rx="14" fill="#c9dd62"/>
<path d="M${round(x + 14)} ${middle - 15}h34M${round(x + 14)} ${middle + 15}h34" stroke="#2b2b28" stroke-width="3"/><ellipse cx="${round(x + 31)}" cy="${middle}" rx="11" ry="14" fill="#f3f8d5"/>`;
}

import type { Light } from './light.ts';
import type { Random } from './random.ts';
import type { Scene } from './scene.ts';
import { pole } from './scene-field.ts';
import { HEIGHT, WIDTH, blob, clods, grass, numberCard, round } from './shapes.ts';
import { strokeText } from './stroke-text.ts';

/** Foam risen round the pole at the ground line. */
export const drawFinish: Scene = (subject, random, light) => {
  const at = { x: 800 + random.between(-60, 60), y: 800 };
  const sunk = subject.foamTopBelowGradeIn > 0;
  const collar = { rx: sunk ? 370 : 400, ry: sunk ? 142 : 158 };
  return [
    floor(random, light, at.y - 420),
    sunk
      ? `<path d="${blob(random, { x: at.x, y: at.y + 6 }, { rx: 440, ry: 182, rough: 0.03 })}" fill="${light.soil.deep}" fill-opacity="0.85"/>`
      : '',
    `<path d="${blob(random, { x: at.x + 26, y: at.y + 34 }, { ...collar, rough: 0.06 })}" fill="#000" fill-opacity="0.35"/>`,
    foam(random, at, collar),
    pole(random, light, { x: at.x, foot: at.y + 16, top: -40, wide: 370, lean: random.between(-1, 1) }),
    skirt(random, { x: at.x, y: at.y + 8 }),
    numberCard(random, subject.structureNumber, { x: random.pick([250, 1350]), y: 1080 }),
  ].join('');
};

/** The gap behind a leaning pole, or under a settled pad, with a rule held in it. */
export const drawGap: Scene = (subject, random, light) => {
  const at = { x: 640 + random.between(-40, 40), y: 780 };
  const open = 60 + Math.min(260, subject.gapIn * 46);
  const wedge = `M${at.x + 150} ${at.y - 46}q${round(open)} -10 ${round(open + 30)} 60q-40 90 -${round(open)} 96q-60 -60 -30 -156Z`;
  return [
    floor(random, light, 380),
    `<path d="${wedge}" fill="${light.soil.deep}"/><path d="${wedge}" fill="none" stroke="${light.soil.light}" stroke-width="9" stroke-opacity="0.6"/>`,
    pole(random, light, { x: at.x, foot: at.y + 60, top: -60, wide: 370, lean: -2 - subject.leanDeg }),
    `<path d="${blob(random, { x: at.x - 60, y: at.y + 78 }, { rx: 260, ry: 40, rough: 0.08 })}" fill="${light.soil.ground}"/>`,
    rule(at.x + 150, at.y - 120, open + 260, `${subject.gapIn}"`),
    numberCard(random, subject.structureNumber, { x: 1300, y: 1070 }),
  ].join('');
};

function floor(random: Random, light: Light, horizon: number): string {
  const bare = (r: Random) => ({ x: r.between(-20, WIDTH + 20), y: r.between(horizon + 40, HEIGHT + 20) });
  const verge = (r: Random) => ({
    x: r.between(-20, WIDTH + 20),
    y: horizon + Math.abs(r.between(-1, 1) * r.between(0, 1)) * 420,
  });
  return `<linearGradient id="back" x1="0" x2="0" y1="0" y2="1"><stop offset="0" stop-color="${light.greens[3]}"/><stop offset="1" stop-color="${light.greens[2]}"/></linearGradient>
<linearGradient id="floor" x1="0" x2="0" y1="0" y2="1"><stop offset="0" stop-color="${light.soil.dark}"/><stop offset="1" stop-color="${light.soil.light}"/></linearGradient>
<rect width="${WIDTH}" height="${HEIGHT}" fill="url(#back)"/><rect y="${horizon}" width="${WIDTH}" height="${HEIGHT - horizon}" fill="url(#floor)"/>
${clods(random, { count: 420, colours: [light.soil.ground, light.soil.light, light.soil.dark], area: bare })}
${grass(random, { count: 900, colours: light.greens, area: verge, length: 120 })}`;
}

/** Foam: lobes that bulge and crack, lighter where the light falls. */
function foam(random: Random, at: { x: number; y: number }, size: { rx: number; ry: number }): string {
  const lobes = Array.from({ length: 34 }, () => {
    const angle = random.between(0, Math.PI * 2);
    const out = random.between(0.62, 0.98);
    const lobe = { x: at.x + Math.cos(angle) * size.rx * out, y: at.y + Math.sin(angle) * size.ry * out };
    const rx = random.between(36, 78);
    const path = blob(random, lobe, { rx, ry: rx * 0.6, rough: 0.1 });
    return {
      y: lobe.y,
      svg: `<path d="${path}" fill="${random.pick(['#dcc678', '#e6d28d', '#d3bb69', '#ecdca0'])}"/><path d="${path}" fill="none" stroke="#a98d3e" stroke-width="3" stroke-opacity="0.35"/>`,
    };
  }).sort((a, b) => a.y - b.y);
  const cells = Array.from({ length: 240 }, () => {
    const angle = random.between(0, Math.PI * 2);
    const out = random.between(0.5, 1.02);
    return `<circle cx="${round(at.x + Math.cos(angle) * size.rx * out)}" cy="${round(at.y + Math.sin(angle) * size.ry * out)}" r="${round(random.between(1.5, 5))}" fill="#9c8034" fill-opacity="${round(random.between(0.2, 0.6))}"/>`;
  }).join('');
  return `<path d="${blob(random, at, { ...size, rough: 0.05 })}" fill="#d8c273"/>${lobes.map((lobe) => lobe.svg).join('')}${cells}`;
}

/** The foam in front of the pole's foot, so that the pole stands in it and not on it. */
function skirt(random: Random, at: { x: number; y: number }): string {
  return Array.from({ length: 11 }, (_, n) => {
    const share = (n / 10) * 2 - 1;
    const lobe = { x: at.x + share * 196, y: at.y + 34 * Math.sqrt(1 - share * share * 0.9) };
    const path = blob(random, lobe, { rx: random.between(34, 52), ry: random.between(22, 34), rough: 0.1 });
    return `<path d="${path}" fill="${random.pick(['#e6d28d', '#ecdca0', '#e0cb82'])}"/><path d="${path}" fill="none" stroke="#a98d3e" stroke-width="3" stroke-opacity="0.3"/>`;
  }).join('');
}

function rule(x: number, y: number, length: number, reading: string): string {
  const ticks = Array.from(
    { length: Math.floor(length / 12) },
    (_, n) =>
      `<path d="M${round(x + 8 + n * 12)} ${y}v${n % 4 === 0 ? 30 : 17}" stroke="#1f1c14" stroke-width="2.5"/>`,
  ).join('');
  return `<rect x="${x + 8}" y="${y + 14}" width="${round(length)}" height="72" fill="#000" fill-opacity="0.3"/><rect x="${x}" y="${y}" width="${round(length)}" height="72" fill="#f2c51d"/>${ticks}${strokeText(reading, { x: x + length - 130, y: y + 32, size: 32, colour: '#1f1c14' })}`;
}

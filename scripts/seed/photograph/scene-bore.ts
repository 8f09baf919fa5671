import type { Light } from './light.ts';
import type { Random } from './random.ts';
import type { Scene } from './scene.ts';
import { HEIGHT, WIDTH, blob, clods, grass, numberCard, round } from './shapes.ts';
import { strokeText } from './stroke-text.ts';

type Hole = { x: number; y: number; rx: number; ry: number };

/** Looking down the bore with the tape hanging in it; the reading stands where the tape crosses the ground. */
export const drawBoreDepth: Scene = (subject, random, light) => {
  const hole = placeHole(random, 400);
  const feet = Math.floor(subject.boreDepthFt);
  const inches = Math.round((subject.boreDepthFt - feet) * 12);
  const reading = inches === 12 ? `${feet + 1}'` : `${feet}' ${inches}"`;
  return [
    ground(random, light, hole),
    bore(random, light, hole),
    tape(random, {
      x: hole.x + random.between(40, 120),
      top: hole.y - hole.ry - 250,
      bottom: hole.y + hole.ry * 0.35,
      reading,
    }),
    numberCard(random, subject.structureNumber, {
      x: random.between(250, 330),
      y: HEIGHT - random.between(150, 200),
    }),
  ].join('');
};

/** Closer, on the bottom: what water stands there, and the stick in it. */
export const drawWater: Scene = (subject, random, light) => {
  const hole = placeHole(random, 520);
  const bottom = {
    x: hole.x + random.between(-12, 12),
    y: hole.y + hole.ry * 0.16,
    rx: hole.rx * 0.6,
    ry: hole.ry * 0.56,
  };
  const wet = subject.waterIn > 0;
  const share = Math.min(1, 0.62 + subject.waterIn * 0.14);
  const pool = blob(random, bottom, { rx: bottom.rx * share, ry: bottom.ry * share, rough: 0.03 });
  const glint = `<ellipse cx="${round(bottom.x - bottom.rx * 0.25)}" cy="${round(bottom.y - bottom.ry * 0.25)}" rx="${round(bottom.rx * 0.3)}" ry="${round(bottom.ry * 0.12)}" fill="${light.sky.low}" fill-opacity="0.45" transform="rotate(-14 ${round(bottom.x)} ${round(bottom.y)})"/>`;
  const water = `<path d="${pool}" fill="#3d5563"/><path d="${pool}" fill="url(#water)"/>${glint}`;
  return [
    `<radialGradient id="water" cx="0.4" cy="0.35" r="0.8"><stop offset="0" stop-color="${light.sky.high}" stop-opacity="0.75"/><stop offset="1" stop-color="#27343a" stop-opacity="0.5"/></radialGradient>`,
    ground(random, light, hole),
    bore(random, light, hole),
    `<ellipse cx="${round(bottom.x)}" cy="${round(bottom.y)}" rx="${round(bottom.rx)}" ry="${round(bottom.ry)}" fill="${light.soil.dark}" fill-opacity="0.85"/>`,
    wet
      ? water
      : clods(random, {
          count: 60,
          colours: [light.soil.dark, light.soil.wall],
          area: (r) => inEllipse(r, bottom),
        }),
    tape(random, {
      x: bottom.x + 40,
      top: hole.y - hole.ry - 60,
      bottom: bottom.y + bottom.ry * 0.2,
      reading: `${subject.waterIn}"`,
    }),
  ].join('');
};

function placeHole(random: Random, rx: number): Hole {
  return {
    x: WIDTH / 2 + random.between(-70, 70),
    y: HEIGHT / 2 + random.between(10, 70),
    rx,
    ry: rx * random.between(0.76, 0.86),
  };
}

function ground(random: Random, light: Light, hole: Hole): string {
  const anywhere = (r: Random) => ({ x: r.between(-20, WIDTH + 20), y: r.between(-10, HEIGHT + 20) });
  const corner = random.pick([0, WIDTH]);
  const spoil = { x: corner + (corner === 0 ? 110 : -110), y: random.between(80, 260), rx: 420, ry: 300 };
  const verge = (r: Random) => ({ x: WIDTH - corner + r.between(-330, 330), y: r.between(0, HEIGHT * 0.55) });
  return [
    `<rect width="${WIDTH}" height="${HEIGHT}" fill="${light.soil.ground}"/>`,
    clods(random, {
      count: 320,
      colours: [light.soil.ground, light.soil.light, light.soil.dark],
      area: anywhere,
    }),
    grass(random, { count: 420, colours: light.greens, area: verge, length: 70 }),
    `<path d="${blob(random, { x: spoil.x + 26, y: spoil.y + 40 }, { ...spoil, rough: 0.05 })}" fill="#000" fill-opacity="0.3"/>`,
    `<radialGradient id="heap" cx="0.45" cy="0.35" r="0.7"><stop offset="0" stop-color="${light.soil.light}"/><stop offset="1" stop-color="${light.soil.dark}"/></radialGradient>`,
    `<path d="${blob(random, spoil, { ...spoil, rough: 0.09 })}" fill="url(#heap)"/>`,
    clods(random, {
      count: 130,
      colours: [light.soil.dark, light.soil.ground],
      area: (r) => onRim(r, spoil),
    }),
    clods(random, {
      count: 300,
      colours: [light.soil.light, light.soil.ground, light.soil.dark, light.soil.wall],
      area: (r) => inEllipse(r, spoil),
    }),
    `<path d="${blob(random, hole, { rx: hole.rx * 1.16, ry: hole.ry * 1.16, rough: 0.05 })}" fill="${light.soil.light}" fill-opacity="0.55"/>`,
  ].join('');
}

/** Rings that shrink and darken give the depth; the far wall takes the light. */
function bore(random: Random, light: Light, hole: Hole): string {
  const rim = blob(random, hole, { rx: hole.rx, ry: hole.ry, rough: 0.022 });
  const rings = Array.from({ length: 15 }, (_, n) => {
    const share = n / 15;
    const narrow = 1 - 0.5 * share;
    const at = `cx="${round(hole.x + random.between(-4, 4))}" cy="${round(hole.y + hole.ry * 0.2 * share)}"`;
    const size = `rx="${round(hole.rx * narrow)}" ry="${round(hole.ry * narrow)}"`;
    const score = `<ellipse ${at} ${size} fill="none" stroke="${random.pick([light.soil.light, '#000'])}" stroke-width="${round(random.between(1, 5))}" stroke-opacity="${round(0.3 * (1 - share)) + 0.06}"/>`;
    return `<ellipse ${at} ${size} fill="${light.soil.deep}" fill-opacity="${(0.05 + share * 0.2).toFixed(2)}"/>${score}`;
  }).join('');
  return `<linearGradient id="wall" x1="0.15" y1="0" x2="0.6" y2="1"><stop offset="0" stop-color="${light.soil.deep}"/><stop offset="0.5" stop-color="${light.soil.wall}"/><stop offset="1" stop-color="${light.soil.light}"/></linearGradient>
<clipPath id="rim"><path d="${rim}"/></clipPath><path d="${rim}" fill="url(#wall)"/><g clip-path="url(#rim)">${rings}</g>
<path d="${rim}" fill="none" stroke="${light.soil.deep}" stroke-width="7" stroke-opacity="0.45"/>`;
}

function tape(
  random: Random,
  { x, top, bottom, reading }: { x: number; top: number; bottom: number; reading: string },
): string {
  const wide = 78;
  const length = bottom - top;
  const ticks = Array.from({ length: Math.floor(length / 18) }, (_, n) => {
    const y = top + 14 + n * 18;
    const long = n % 4 === 0 ? wide * 0.55 : wide * 0.28;
    return `<path d="M${round(x)} ${round(y)}h${round(long)}" stroke="#1f1c14" stroke-width="${n % 4 === 0 ? 4 : 2.5}"/>`;
  }).join('');
  const label = reading.length * 51 + 34;
  return `<g transform="rotate(${round(random.between(-5, 7))} ${round(x)} ${round(bottom)})">
<linearGradient id="tape" x1="0" x2="0" y1="0" y2="1"><stop offset="0.35" stop-color="#f2c51d"/><stop offset="1" stop-color="#8d7013"/></linearGradient>
<rect x="${round(x + 14)}" y="${round(top + 20)}" width="${wide}" height="${round(length - 10)}" fill="#000" fill-opacity="0.32"/>
<rect x="${round(x)}" y="${round(top)}" width="${wide}" height="${round(length)}" fill="url(#tape)"/>${ticks}
<rect x="${round(x - 12)}" y="${round(top + length * 0.14)}" width="${label}" height="94" rx="6" fill="#f7d64a" stroke="#7d6410" stroke-width="3"/>
${strokeText(reading, { x: x + 14, y: top + length * 0.14 + 20, size: 54, colour: '#1f1c14' })}</g>`;
}

function onRim(random: Random, at: Hole): { x: number; y: number } {
  const angle = random.between(0, Math.PI * 2);
  const out = random.between(0.92, 1.12);
  return { x: at.x + Math.cos(angle) * at.rx * out, y: at.y + Math.sin(angle) * at.ry * out };
}

function inEllipse(random: Random, at: Hole): { x: number; y: number } {
  const angle = random.between(0, Math.PI * 2);
  const out = Math.sqrt(random.between(0, 1));
  return { x: at.x + Math.cos(angle) * at.rx * out, y: at.y + Math.sin(angle) * at.ry * out };
}

import sharp from 'sharp';
import { type Capture, exifOf } from './photograph/exif.ts';
import { chooseLight } from './photograph/light.ts';
import { createRandom, seedOf } from './photograph/random.ts';
import { drawBoreDepth, drawWater } from './photograph/scene-bore.ts';
import { drawFinish, drawGap } from './photograph/scene-ground-line.ts';
import { drawKits } from './photograph/scene-kits.ts';
import { drawPad } from './photograph/scene-pad.ts';
import { drawBrand, drawPlumb, drawStanding } from './photograph/scene-pole.ts';
import type { Scene, Subject, View } from './photograph/scene.ts';
import { HEIGHT, WIDTH, round } from './photograph/shapes.ts';
import { GRAIN_SLACK, grainAt } from './photograph/texture.ts';

const SCENES: Readonly<Record<View, Scene>> = {
  'bore-depth': drawBoreDepth,
  water: drawWater,
  kits: drawKits,
  finish: drawFinish,
  plumb: drawPlumb,
  brand: drawBrand,
  before: drawStanding,
  gap: drawGap,
  after: drawStanding,
  'level-after': drawPad,
  rework: drawFinish,
};

/**
 * Draws one demo photograph: 1600 × 1200, JPEG, with capture time and position in its EXIF. Nobody and no real place
 * is in it. The same request gives the same picture.
 */
export async function drawPhotograph(subject: Subject, capture: Capture): Promise<Buffer> {
  const place = createRandom(seedOf(subject.structureNumber));
  const shot = createRandom(seedOf(`${subject.structureNumber} ${subject.view} ${capture.takenAt}`));
  const hour = Number(capture.takenAt.slice(11, 13));
  const light = chooseLight({ place, shot, hour });
  const scene = subject.kind === 'relevel' && subject.view !== 'kits' ? drawPad : SCENES[subject.view];
  const turn = round(shot.between(-1.6, 1.6));
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" viewBox="0 0 ${WIDTH} ${HEIGHT}">
<g transform="rotate(${turn} 800 600) translate(-32 -24) scale(1.04)">${scene(subject, shot, light)}</g>
<radialGradient id="vignette" cx="0.5" cy="0.48" r="0.75"><stop offset="0.55" stop-color="#000" stop-opacity="0"/><stop offset="1" stop-color="#000" stop-opacity="0.36"/></radialGradient>
<rect width="${WIDTH}" height="${HEIGHT}" fill="${light.tint}" opacity="${light.tintShare.toFixed(3)}"/><rect width="${WIDTH}" height="${HEIGHT}" fill="url(#vignette)"/></svg>`;
  const grain = await grainAt(shot.whole(0, GRAIN_SLACK.x), shot.whole(0, GRAIN_SLACK.y), {
    width: WIDTH,
    height: HEIGHT,
  });
  return sharp(Buffer.from(svg))
    .flatten({ background: light.soil.ground })
    .blur(0.6)
    .composite([{ input: grain, raw: { width: WIDTH, height: HEIGHT, channels: 1 }, blend: 'overlay' }])
    .jpeg({ quality: 64, chromaSubsampling: '4:2:0' })
    .withExif(exifOf(capture))
    .toBuffer();
}

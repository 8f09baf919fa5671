import sharp from 'sharp';
import { createRandom } from './random.ts';

const WIDE = 1800;
const HIGH = 1400;
let made: Promise<Buffer> | null = null;

/** A grey grain to lay over a drawing (soft light), from coarse mottling to the sensor's noise; made once. */
export async function grainAt(
  left: number,
  top: number,
  size: { width: number; height: number },
): Promise<Buffer> {
  made ??= makeGrain();
  const raw = { width: WIDE, height: HIGH, channels: 1 as const };
  return sharp(await made, { raw })
    .extract({ left, top, ...size })
    .toColourspace('b-w')
    .raw()
    .toBuffer();
}

export const GRAIN_SLACK = { x: WIDE - 1600, y: HIGH - 1200 };

async function makeGrain(): Promise<Buffer> {
  const sum = new Float32Array(WIDE * HIGH);
  // cell size in pixels, and how strongly it shows
  for (const [cell, weight] of [
    [110, 4],
    [22, 5],
    [6, 8],
    [2, 11],
    [1, 10],
  ] as const)
    await addOctave(sum, cell, weight);
  return Buffer.from(Uint8Array.from(sum, (value) => Math.max(0, Math.min(255, 128 + value))));
}

async function addOctave(sum: Float32Array, cell: number, weight: number): Promise<void> {
  const width = Math.ceil(WIDE / cell) + 1;
  const height = Math.ceil(HIGH / cell) + 1;
  const random = createRandom(cell * 7919);
  const coarse = Buffer.from(Uint8Array.from({ length: width * height }, () => random.whole(0, 255)));
  const fine = await sharp(coarse, { raw: { width, height, channels: 1 } })
    .resize(WIDE, HIGH, { fit: 'fill', kernel: 'cubic' })
    .toColourspace('b-w')
    .raw()
    .toBuffer();
  for (let n = 0; n < sum.length; n++) sum[n]! += ((fine[n]! - 128) / 128) * weight;
}

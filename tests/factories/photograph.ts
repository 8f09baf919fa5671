import { randomInt } from 'node:crypto';
import sharp, { type Exif } from 'sharp';

/** A small JPEG that no other is alike byte for byte. */
export function photograph(options: { width?: number; height?: number; exif?: Exif } = {}): Promise<Buffer> {
  const { width = 64, height = 48, exif } = options;
  const picture = sharp({
    create: {
      width,
      height,
      channels: 3,
      background: { r: randomInt(256), g: randomInt(256), b: randomInt(256) },
    },
  });
  const tag = { IFD0: { ImageDescription: `picture ${randomInt(2 ** 40)}` } };
  return picture
    .withExif({ ...tag, ...exif })
    .jpeg()
    .toBuffer();
}

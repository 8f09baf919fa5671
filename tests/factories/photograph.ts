import { randomInt } from 'node:crypto';
import sharp, { type Exif } from 'sharp';

/** Taken at 10:00 of the work day of `setRow`, in the work order's zone. */
const TAKEN = { DateTimeOriginal: '2026:04:14 10:00:00', OffsetTimeOriginal: '-05:00' };

/** A JPEG that meets the rules on photographs of `setRow`'s work, and that no other is alike byte for byte. */
export function photograph(options: { width?: number; height?: number; exif?: Exif } = {}): Promise<Buffer> {
  const { width = 1000, height = 750, exif } = options;
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
    .withExif({ ...tag, IFD2: TAKEN, ...exif })
    .jpeg()
    .toBuffer();
}

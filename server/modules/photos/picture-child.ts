import { open } from 'node:fs/promises';
import exifr from 'exifr';
import sharp from 'sharp';
import { placeFrom, takenFrom } from './exif-facts.ts';
import type { PictureAnswer, PictureFacts, PictureRequest } from './picture-messages.ts';
import { HEAD_BYTES, pictureType } from './picture-type.ts';

const THUMB_PX = 320;
const DISPLAY_PX = 1_600;
const MOST_PIXELS = 90_000_000;
const TAGS = [
  'DateTimeOriginal',
  'OffsetTimeOriginal',
  'OffsetTime',
  'GPSLatitude',
  'GPSLatitudeRef',
  'GPSLongitude',
  'GPSLongitudeRef',
];

// Of all loaders only those of the three kinds that are taken here: no SVG, PDF or the like is ever parsed.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
  operation: ['VipsForeignLoadJpegFile', 'VipsForeignLoadPngFile', 'VipsForeignLoadWebpFile'],
});
sharp.cache(false);
sharp.concurrency(1);

/** Runs in a process of its own: a picture that brings the decoder down takes nothing with it. */
async function answer(request: PictureRequest): Promise<PictureAnswer> {
  const file = await open(request.source);
  let head: Uint8Array;
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
    head = buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
  const verdict = pictureType(head);
  if ('code' in verdict) return { type: 'problem', ...verdict };
  try {
    const { width, height } = await draw(request);
    return {
      type: 'facts',
      facts: { type: verdict.type, width, height, ...(await readExif(request.source)) },
    };
  } catch (error) {
    return { type: 'problem', ...problemOf(error) };
  }
}

async function draw(request: PictureRequest): Promise<{ width: number; height: number }> {
  const input = { limitInputPixels: MOST_PIXELS, failOn: 'truncated', animated: false } as const;
  const { autoOrient } = await sharp(request.source, input).metadata();
  const inside = (size: number) =>
    sharp(request.source, input)
      .autoOrient()
      .resize({ width: size, height: size, fit: 'inside', withoutEnlargement: true })
      .flatten({ background: '#ffffff' });
  // Written anew, without the camera's notes: position is shown by what the record allows, not by the picture.
  await inside(DISPLAY_PX).jpeg({ quality: 82, mozjpeg: true }).toFile(request.display);
  await inside(THUMB_PX).jpeg({ quality: 76, mozjpeg: true }).toFile(request.thumb);
  return autoOrient;
}

/** EXIF that cannot be read is unknown, never a fault of the photograph. */
async function readExif(path: string): Promise<Omit<PictureFacts, 'type' | 'width' | 'height'>> {
  const tags = await exifr
    .parse(path, { pick: TAGS, reviveValues: false, translateValues: false })
    .catch(() => null);
  const found = (tags ?? {}) as Readonly<Record<string, unknown>>;
  return { ...takenFrom(found), ...placeFrom(found) };
}

function problemOf(error: unknown): { code: string; detail: string } {
  const message = error instanceof Error ? error.message : '';
  if (/pixel limit/iu.test(message))
    return {
      code: 'photo.too-many-pixels',
      detail: 'The picture has more than 90 million pixels. Save it smaller and upload it again.',
    };
  return {
    code: 'photo.damaged',
    detail: 'The picture is damaged or broke off. Take it from the camera again and upload it.',
  };
}

process.on('message', (request: PictureRequest) => {
  answer(request).then(
    (reply) => process.send?.(reply),
    () => process.exit(1),
  );
});

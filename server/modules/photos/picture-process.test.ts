import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PictureProcess } from './picture-process.ts';

const never = new AbortController().signal;
let folder: string;
const pictures = new PictureProcess();
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'upstand-test-'));
});
afterAll(async () => {
  pictures.close();
  await rm(folder, { recursive: true, force: true });
});

const decode = async (bytes: Uint8Array) => {
  const source = join(folder, 'source');
  await writeFile(source, bytes);
  const files = { source, thumb: join(folder, 'thumb.jpg'), display: join(folder, 'display.jpg') };
  return { answer: await pictures.decode(files, never), files };
};
const plain = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: '#886644' } });

describe('PictureProcess', () => {
  it('writes display sizes and reads when and where', async () => {
    const bytes = await plain(2_400, 1_200)
      .withExif({
        IFD2: { DateTimeOriginal: '2026:04:14 10:24:05', OffsetTimeOriginal: '-05:00' },
        IFD3: {
          GPSLatitude: '41/1 30/1 36/1',
          GPSLatitudeRef: 'N',
          GPSLongitude: '93/1 15/1 0/1',
          GPSLongitudeRef: 'W',
        },
      })
      .jpeg()
      .toBuffer();
    const { answer, files } = await decode(bytes);
    expect(answer).toMatchObject({
      type: 'facts',
      facts: {
        type: 'image/jpeg',
        width: 2_400,
        height: 1_200,
        takenWall: '2026-04-14T10:24:05',
        takenAt: '2026-04-14T15:24:05.000Z',
        latitude: expect.closeTo(41.51, 6),
        longitude: expect.closeTo(-93.25, 6),
      },
    });
    expect(await sharp(await readFile(files.display)).metadata()).toMatchObject({
      width: 1_600,
      height: 800,
    });
    const thumb = await sharp(await readFile(files.thumb)).metadata();
    expect(thumb).toMatchObject({ width: 320, height: 160, format: 'jpeg' });
    expect(thumb.exif).toBeUndefined();
  });

  it('takes PNG and WebP, whose time and place are unknown', async () => {
    const { answer } = await decode(await plain(40, 30).webp().toBuffer());
    expect(answer).toMatchObject({
      type: 'facts',
      facts: { type: 'image/webp', takenWall: null, latitude: null },
    });
    expect((await decode(await plain(40, 30).png().toBuffer())).answer).toMatchObject({ type: 'facts' });
  });

  it.each([
    ['photo.svg', async () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>')],
    ['photo.damaged', async () => (await plain(400, 400).jpeg().toBuffer()).subarray(0, 600)],
    ['photo.too-many-pixels', async () => plain(10_000, 9_500).png({ compressionLevel: 1 }).toBuffer()],
  ])('refuses %s and goes on', async (code, make) => {
    expect((await decode(await make())).answer).toMatchObject({ type: 'problem', code });
    expect((await decode(await plain(40, 30).jpeg().toBuffer())).answer).toMatchObject({ type: 'facts' });
  });
});

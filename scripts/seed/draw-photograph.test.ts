import exifr from 'exifr';
import sharp from 'sharp';
import { expect, it } from 'vitest';
import { drawPhotograph } from './draw-photograph.ts';

it('draws a photograph with the time, offset and place that it was asked for', async () => {
  const subject = {
    view: 'kits',
    kind: 'set',
    structureNumber: '17-0417',
    boreDepthFt: 6,
    waterIn: 0,
    foamTopBelowGradeIn: 0,
    kits: [{ kitFt3: 4, quantity: 2, lot: 'LK-2291' }],
    leanDeg: 0,
    gapIn: 0,
    pole: { lengthFt: 40, poleClass: '4' },
  } as const;
  const capture = {
    takenAt: '2026-04-14T10:24:05',
    offset: '-05:00',
    latitude: 41.904121,
    longitude: -94.718362,
  };
  const picture = await drawPhotograph(subject, capture);
  expect(await sharp(picture).metadata()).toMatchObject({ format: 'jpeg', width: 1600, height: 1200 });
  const exif: unknown = await exifr.parse(picture, { reviveValues: false, gps: true });
  expect(exif).toMatchObject({
    DateTimeOriginal: '2026:04:14 10:24:05',
    OffsetTimeOriginal: '-05:00',
    latitude: expect.closeTo(41.904121, 6),
    longitude: expect.closeTo(-94.718362, 6),
  });
});

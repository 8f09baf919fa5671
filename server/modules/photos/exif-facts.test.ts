import { describe, expect, it } from 'vitest';
import { placeFrom, takenFrom } from './exif-facts.ts';

describe('takenFrom', () => {
  it('keeps the wall clock, and the instant where the offset is given', () => {
    // 10:24:05 at five hours behind UTC is 15:24:05 UTC.
    expect(takenFrom({ DateTimeOriginal: '2026:04:14 10:24:05', OffsetTimeOriginal: '-05:00' })).toEqual({
      takenWall: '2026-04-14T10:24:05',
      takenAt: '2026-04-14T15:24:05.000Z',
    });
  });
  it('is no instant without an offset', () => {
    expect(takenFrom({ DateTimeOriginal: '2026:04:14 10:24:05' })).toEqual({
      takenWall: '2026-04-14T10:24:05',
      takenAt: null,
    });
  });
  it.each(['0000:00:00 00:00:00', '    :  :     :  :  ', '2026:13:40 10:24:05', ''])(
    '%j is unknown',
    (value) => {
      expect(takenFrom({ DateTimeOriginal: value })).toEqual({ takenWall: null, takenAt: null });
    },
  );
});

describe('placeFrom', () => {
  it('reads degrees, minutes, seconds', () => {
    // 41° 30′ 36″ N is 41.51; 93° 15′ 0″ W is -93.25.
    const place = placeFrom({
      GPSLatitude: [41, 30, 36],
      GPSLatitudeRef: 'N',
      GPSLongitude: [93, 15, 0],
      GPSLongitudeRef: 'W',
    });
    expect(place.latitude).toBeCloseTo(41.51, 9);
    expect(place.longitude).toBeCloseTo(-93.25, 9);
  });
  it.each([
    ['no fix', { GPSLatitude: [0, 0, 0], GPSLongitude: [0, 0, 0] }],
    ['not a number', { GPSLatitude: [Number.NaN, 0, 0], GPSLongitude: [93, 0, 0] }],
    ['out of range', { GPSLatitude: [99, 0, 0], GPSLongitude: [93, 0, 0] }],
    ['nothing', {}],
  ])('%s is unknown', (_why, tags) => {
    expect(placeFrom(tags)).toEqual({ latitude: null, longitude: null });
  });
});

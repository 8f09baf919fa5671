import { expect } from 'vitest';
import type { Failing } from './failing-lines.ts';
import { photosWith } from './full-context.ts';

/** What is seen on photographs; facts of the set pole's picture `finish` changed. */
export const FAILING_PHOTOS: readonly Failing[] = [
  {
    code: 'photo-reused',
    context: {
      otherPhotos: [
        {
          sha256: 'set finish',
          phash: null,
          view: 'finish',
          structureNumber: 'X-9',
          batch: 'B-2',
          own: false,
        },
      ],
    },
    expected: {
      measured: 'finish.jpg',
      params: { view: 'finish' },
      ownerParams: { other: 'X-9', otherBatch: 'B-2' },
    },
  },
  // One bit from the straightened pole's pictures; the set pole's own do not count.
  {
    code: 'photo-alike',
    context: { photos: photosWith({ phash: '00ff00ff00ff00fe' }) },
    expected: { measured: 'finish.jpg', params: { view: 'finish', bits: 1, greatest: 6, other: 'S-2' } },
  },
  // The last time of the set pole is its first work at 10:40.
  {
    code: 'photo-elsewhen',
    context: { photos: photosWith({ takenWall: '2026-04-14T11:30:00' }) },
    expected: { measured: '2026-04-14T11:30', limit: '2026-04-14T10:40', margin: -20, unit: 'min' },
  },
  // 0.001° of latitude at 35.1° north are 110.94242 m (GeographicLib), 363.98430 ft.
  {
    code: 'photo-elsewhere',
    context: { photos: photosWith({ latitude: 35.101 }) },
    expected: { measured: expect.closeTo(363.9843, 3), limit: 150, margin: expect.closeTo(-213.9843, 3) },
  },
  {
    code: 'photo-undated',
    context: { photos: photosWith({ takenWall: null }) },
    expected: { measured: 'finish.jpg', limit: null, severity: 'note' },
  },
  {
    code: 'photo-small',
    context: { photos: photosWith({ width: 800, height: 600 }) },
    expected: { measured: 800, limit: 1000, margin: -200, unit: 'px' },
  },
];

import { formatWallClock } from '#src/lib/formats.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import type { Photo } from '#shared/generated/api-types.ts';

export { viewWord } from '#shared/records/view-word.ts';

/** `10:19, 11 ft from position`: the wall clock of the camera, and how far from the structure it stood. */
export function photoFacts(
  photo: Pick<Photo, 'takenAt' | 'distanceFt'>,
  {
    metric,
    withDay = false,
    short = false,
  }: { readonly metric: boolean; readonly withDay?: boolean; readonly short?: boolean },
): string {
  const clock = photo.takenAt === null ? 'no capture time' : formatWallClock(photo.takenAt);
  const time = withDay ? clock : clock.replace(/^.*, /, '');
  const from =
    photo.distanceFt === null
      ? 'no position'
      : `${formatQuantity(photo.distanceFt, 'ft', { metric, digits: metric ? 1 : 0 })}${short ? ' off' : ' from position'}`;
  return `${time}, ${from}`;
}

export function photoAddress(id: string, size: 'thumb' | 'display' | 'original'): string {
  return `/api/photos/${encodeURIComponent(id)}/file?size=${size}`;
}
